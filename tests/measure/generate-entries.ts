// Ten thousand entries that read like the trade. Three sentences in four are taken from the demo, so that words are as common
// as in what people write; the fourth is made of trade words (content/synonyms.json), operations and sections.
// They measure; nobody is meant to build by them.
import kits from '@/content/demo/kits.json'
import operations from '@/content/operations.json'
import synonyms from '@/content/synonyms.json'
import { demoContent } from '@/lib/content/demo-content'
import { seededRandom, type Chance } from './seeded-random'

/** A line of an import, as lib/services/import reads it. */
export interface GeneratedLine {
  ref: string; kind: 'question' | 'lesson'; kit: string; sections: string[]; tasks: string[]; hardware: string[]
  title: string; body: string; author: string; createdAt: string; stamped?: true; answers: { ref: string; body: string; author: string; stamped?: true }[]
}

const words = synonyms.twoWay.flat()
const tasks = operations.flatMap((operation) => operation.tasks)
const sizes = ['#30', '#40', '#19', '3/32 in', '1/8 in', '3/16 in', '1/4 in', '5/16 in', '0.032 in', '0.040 in', 'AN3-5A', 'AN470AD4-4', 'AN426AD3-3.5']
const hardware = ['AN3-5A', 'AN4-7A', 'MS21042-3', 'AN470AD4-4', 'AN426AD3-3.5', 'MK1000-06', 'AN960-10', 'MS35489-6']
const people = ['A. Thornby', 'Merle', 'J. Okafor', 'Petra', 'R. Lindqvist', 'Sami', 'H. Brandt', 'Wyn', 'C. Duarte', 'Ines']
const madeSentences = [
  'I {task} the {word} on the {section} before the {word} went on.',
  'The plans step shows {size} but the {word} measured a little under that at the edge.',
  'With the {word} clamped to the {word}, everything lined up on the second try.',
  'My helper held the {word} from the inside while I worked the {word} outside.',
  'It took two evenings because the {word} had to come off again for the {word}.',
  'Check the {word} with a straight edge, then again after you {task}.',
  'Next time I would {task} first and leave the {word} until the {section} is closed up.',
  'There was a gap of {size} between the {word} and the {word} when it was all cold.',
  'A scrap piece the same thickness told me more about the {word} than the manual did.',
  'Nothing was cracked, but the {word} left a mark that showed through the paint.',
  'The {word} in the box was for {size}, which is one size larger than what the page calls out.',
  'Keep the {word} square to the {word} and go slowly near the corner of the {section}.',
]
const writtenSentences = demoContent.entries
  .flatMap((entry) => [...Object.values(entry.parts), ...(entry.answers ?? []).map((answer) => answer.body)])
  .flatMap((said) => (typeof said === 'string' ? said.split(/(?<=[.!?])\s+/) : []))
  .filter((sentence) => sentence.length > 30 && sentence.length < 240)
const wordsAText = 120
const dayMs = 24 * 3600 * 1000

function sentence(chance: Chance, section: string): string {
  if (chance.next() < 0.75) return chance.pick(writtenSentences)
  return chance.pick(madeSentences).replace(/\{(\w+)\}/g, (_, slot: string) => {
    if (slot === 'task') return chance.pickCommon(tasks).title
    if (slot === 'size') return chance.pickCommon(sizes)
    return slot === 'section' ? section.toLowerCase() : chance.pickCommon(words)
  })
}

function text(chance: Chance, section: string, length: number): string {
  const written: string[] = []
  for (let count = 0; count < length;) {
    const made = sentence(chance, section)
    written.push(made)
    count += made.split(' ').length
  }
  return written.map((made, i) => (i % 4 === 3 ? `${made}\n\n` : `${made} `)).join('').trim()
}

function titleOf(chance: Chance, section: string): string {
  const [one, two] = [chance.pickCommon(words), chance.pickCommon(words)]
  return chance.pick([`${one} on the ${section.toLowerCase()}: ${two} in the way`, `Which ${one} for the ${two}, ${chance.pickCommon(sizes)}`, `${chance.pickCommon(tasks).title} before the ${one} or after`, `What the ${one} taught me about the ${two}`])
}

/** `count` lines, about 120 words each: one in three with an answer, one in ten stamped where it was imported from. */
export function generateEntries(count: number, seed: number, now: number): GeneratedLine[] {
  const chance = seededRandom(seed)
  return Array.from({ length: count }, (_, i): GeneratedLine => {
    const kit = chance.next() < 0.8 ? kits[0]! : kits[1]!
    const section = chance.pick(kit.sections)
    const kind = i % 3 === 1 ? 'lesson' : 'question'
    // A question is answered, not stamped: of the other two thirds these many make one in ten of all.
    const stamp = chance.next() < 0.15 ? { stamped: true as const } : {}
    return {
      ref: `generated-${i}`, kind, kit: kit.slug, sections: [section.code], tasks: [chance.pickCommon(tasks).slug], hardware: chance.next() < 0.3 ? [chance.pick(hardware)] : [],
      title: titleOf(chance, section.title).slice(0, 150), body: text(chance, section.title, wordsAText), author: chance.pick(people),
      createdAt: new Date(now - chance.below(1500) * dayMs).toISOString(), ...(kind === 'lesson' ? stamp : {}),
      answers: i % 3 === 0 ? [{ ref: `generated-${i}-a`, body: text(chance, section.title, wordsAText), author: chance.pick(people), ...stamp }] : [],
    }
  })
}
