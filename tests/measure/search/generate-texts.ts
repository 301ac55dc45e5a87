// Entries by the hundred thousand, each made from the seed and its number alone, so that every process makes the same ones and none
// has to hold them. Words are as common as in the demo's texts; one in eight comes from a long tail of made-up ones, because a real
// corpus has as many rare words as it has entries, and an index pays for each. They measure; nobody is meant to read them.
import kits from '@/content/demo/kits.json'
import operations from '@/content/operations.json'
import { demoContent } from '@/lib/content/demo-content'
import { seededRandom, type Chance } from '../seeded-random'

export interface GeneratedText {
  /** From 0. */
  number: number
  kind: 'question' | 'lesson'; kit: string; section: string; operation: string; hardware: string[]
  title: string; body: string; answer: string | null; stamped: boolean
}

/** Words in the order in which they were written, so that picking one picks the common ones as often as people write them. */
const written = demoContent.entries
  .flatMap((entry) => [entry.title, ...Object.values(entry.parts), ...(entry.answers ?? []).map((answer) => answer.body)])
  .flatMap((said) => (typeof said === 'string' ? (said.toLowerCase().match(/[a-z][a-z'-]*[a-z]|a|i/g) ?? []) : []))
const sizes = ['#30', '#40', '#19', '3/32 in', '1/8 in', '3/16 in', '0.032 in', '0.040 in', 'AN3-5A', 'AN470AD4-4', 'AN426AD3-3.5', 'MS21042-3']
const rareWords = 60_000
const shareRare = 1 / 8
const wordsAnEntry = 120

const syllables = [...'bcdfghjklmnprstvw'].flatMap((consonant) => [...'aeiou'].map((vowel) => consonant + vowel))

/** The n-th made-up word: pronounceable, and another for every n. */
export function madeUpWord(n: number): string {
  let [word, rest] = ['', n + syllables.length]
  for (; rest > 0; rest = Math.floor(rest / syllables.length)) word = (syllables[rest % syllables.length] ?? '') + word
  return `${word}x`
}

/** The n-th rarest is n times as rare as the first (Zipf), from what has already a few places in the order. */
const rareWord = (chance: Chance): string => madeUpWord(Math.floor(20 * ((rareWords / 20 + 1) ** chance.next() - 1)))

function words(chance: Chance, count: number): string[] {
  const made: string[] = []
  while (made.length < count) {
    if (chance.next() < shareRare) made.push(rareWord(chance))
    else {
      // Runs of what was written keep phrases whole.
      const at = chance.below(written.length - 6)
      made.push(...written.slice(at, at + 2 + chance.below(5)))
    }
  }
  return made.slice(0, count)
}

function prose(chance: Chance, count: number): string {
  const sentences: string[] = []
  for (let left = count; left > 0; left -= 12) sentences.push(`${words(chance, Math.min(12, left)).join(' ')}${chance.next() < 0.2 ? ` ${chance.pick(sizes)}` : ''}.`)
  return sentences.join(' ')
}

/** Entry `number` of the corpus that `seed` makes: 120 words, in one of three partly in an answer; one in ten is stamped. */
export function generateText(number: number, seed: number): GeneratedText {
  const chance = seededRandom(Math.imul(seed, 1_000_003) + number)
  // The first numbers of neighbouring seeds are alike.
  for (let i = 0; i < 3; i++) chance.next()
  const kit = chance.pick(kits)
  const isAnswered = number % 3 === 0
  return {
    number, kind: number % 3 === 1 ? 'lesson' : 'question', kit: kit.slug, section: chance.pick(kit.sections).code, operation: chance.pickCommon(operations).slug,
    hardware: chance.next() < 0.3 ? [chance.pick(sizes)] : [],
    title: words(chance, 7).join(' '), body: prose(chance, isAnswered ? wordsAnEntry / 2 : wordsAnEntry), answer: isAnswered ? prose(chance, wordsAnEntry / 2) : null,
    stamped: number % 10 === 0,
  }
}

/** All `count` entries, one at a time. */
export function* generateTexts(count: number, seed: number): Generator<GeneratedText> {
  for (let number = 0; number < count; number++) yield generateText(number, seed)
}
