// What people type into the search line: half two words, a quarter with a typing error, a quarter broken off while typing.
import type { GeneratedLine } from './generate-entries'
import { seededRandom, type Chance } from './seeded-random'

const fillers = new Set(['what', 'which', 'about', 'before', 'after', 'taught', 'with', 'that', 'this', 'from', 'they', 'then', 'than', 'when', 'have', 'were', 'there', 'would'])

/** Half of the time from a title, else from anywhere in the text. */
function twoWords(chance: Chance, entries: readonly GeneratedLine[]): string {
  for (;;) {
    const { title, body } = chance.pick(entries)
    const words = (chance.next() < 0.5 ? title : body).toLowerCase().match(/[a-z]{4,}/g)?.filter((word) => !fillers.has(word)) ?? []
    if (words.length < 2) continue
    const [one, two] = [chance.pick(words), chance.pick(words)]
    if (one !== two) return `${one} ${two}`
  }
}

/** Leaves out, doubles or swaps one letter, never the first. */
function mistype(chance: Chance, text: string): string {
  const at = 1 + chance.below(Math.max(1, text.indexOf(' ') - 1))
  const letter = text.charAt(at)
  const slip = chance.below(3)
  if (slip === 0) return text.slice(0, at) + text.slice(at + 1)
  if (slip === 1) return text.slice(0, at) + letter + text.slice(at)
  return text.slice(0, at) + text.charAt(at + 1) + letter + text.slice(at + 2)
}

/** `count` queries in the mix that the numbers are promised for. */
export function generateQueries(count: number, entries: readonly GeneratedLine[], seed: number): string[] {
  const chance = seededRandom(seed)
  return Array.from({ length: count }, (_, i) => {
    const text = twoWords(chance, entries)
    if (i % 4 === 1) return mistype(chance, text)
    if (i % 4 === 3) return text.slice(0, 2 + chance.below(text.length - 2))
    return text
  })
}
