// What the engines are asked: words by how many entries hold them, with slips, broken off, and with filters.
import { isStopWord } from '@/lib/domain/search/stop-words'
import { seededRandom, type Chance } from '../seeded-random'
import { generateText, generateTexts } from './generate-texts'

export interface AskedQuestion { text: string; kit?: string; /** The last word is not finished. */ isPrefix?: boolean; /** A letter is wrong. */ hasSlip?: boolean }
export interface QuestionKind { kind: string; questions: AskedQuestion[] }

/** `a`, `b`, `c` … of the kinds of words, drawn from the corpus itself. */
interface Words { rare(): string; any(): string; common(): string }

/** Every kind of question, `each` of it, for the corpus of `size` entries that `seed` makes. */
export function makeQuestions(size: number, seed: number, each: number): QuestionKind[] {
  const chance = seededRandom(seed + 1)
  const words = wordsOf(size, seed, chance)
  const several = (count: number, from: () => string): AskedQuestion => {
    const chosen = new Set<string>()
    while (chosen.size < count) chosen.add(from())
    return { text: [...chosen].join(' ') }
  }
  const kind = (name: string, make: () => AskedQuestion): QuestionKind => ({ kind: name, questions: Array.from({ length: each }, make) })
  return [
    ...([1, 2, 4] as const).flatMap((count) => (['rare', 'any', 'common'] as const).map((which) =>
      kind(`${count === 1 ? '1 word' : `${count} words`}, ${which}`, () => several(count, words[which])))),
    kind('4 words, 2 common', () => ({ text: `${several(2, words.any).text} ${several(2, words.common).text}` })),
    kind('2 words, one slip', () => ({ text: `${mistype(chance, words.any())} ${words.any()}`, hasSlip: true })),
    kind('1 word begun', () => ({ text: begin(chance, words.any()), isPrefix: true })),
    kind('2 words, last begun', () => ({ text: `${words.any()} ${begin(chance, words.any())}`, isPrefix: true })),
    kind('2 words in one kit', () => ({ ...several(2, words.any), kit: 'whimbrel-2' })),
    kind('2 common in one kit', () => ({ ...several(2, words.common), kit: 'whimbrel-2' })),
  ]
}

/** Counted over a sample: which words are common is the same in every part of the corpus. */
const sample = 5_000
const commonest = 40

function wordsOf(size: number, seed: number, chance: Chance): Words {
  const counts = new Map<string, number>()
  for (const { title, body, answer } of generateTexts(Math.min(size, sample), seed)) {
    for (const word of new Set(wordsIn(`${title} ${body} ${answer ?? ''}`))) counts.set(word, (counts.get(word) ?? 0) + 1)
  }
  const ranked = [...counts].sort((a, b) => b[1] - a[1] || (a[0] < b[0] ? -1 : 1)).map(([word]) => word)
  const rare = ranked.filter((word) => counts.get(word) === 1)
  return {
    rare: () => chance.pick(rare), common: () => chance.pick(ranked.slice(0, commonest)),
    any: () => {
      const { title, body } = generateText(chance.below(size), seed)
      return chance.pick(wordsIn(`${title} ${body}`))
    },
  }
}

const wordsIn = (text: string): string[] => (text.match(/\b[a-z]{4,}\b/g) ?? []).filter((word) => !isStopWord(word))

function mistype(chance: Chance, word: string): string {
  const at = 1 + chance.below(word.length - 2)
  const slip = chance.below(3)
  if (slip === 0) return word.slice(0, at) + word.slice(at + 1)
  return slip === 1 ? word.slice(0, at) + word.charAt(at) + word.slice(at) : word.slice(0, at) + word.charAt(at + 1) + word.charAt(at) + word.slice(at + 2)
}

const begin = (chance: Chance, word: string): string => word.slice(0, 3 + chance.below(Math.max(1, word.length - 3)))
