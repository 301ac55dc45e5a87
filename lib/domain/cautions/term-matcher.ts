// Finds the terms of one word list in a text's trade words, by look-up and without regular expressions made from data.
// The term language is told in rule-table.ts.
import { formOf, stemOf, type TradeText, type TradeWord } from './trade-words'

/** Where a term stands: indices into the row of words, `last` included. */
export interface TermHit {
  first: number
  last: number
}

type WordTest = (word: TradeWord) => boolean
type Step = { kind: 'word'; test: WordTest } | { kind: 'gap' }
export type TermMatcher = (text: TradeText) => TermHit[]

const LONGEST_GAP = 3

/** Compiles terms to a matcher. Hits come in text order and never overlap; an empty list of terms finds nothing. */
export function compileTerms(terms: readonly string[]): TermMatcher {
  const byStem = new Map<string, Step[][]>()
  const byForm = new Map<string, Step[][]>()
  const byPrefix: { prefix: string; steps: Step[] }[] = []
  for (const term of terms) {
    const [head = '', ...rest] = term.toLowerCase().split(/\s+/)
    const steps = rest.map(stepOf)
    for (const word of head.split('/')) {
      if (word.endsWith('*')) byPrefix.push({ prefix: word.slice(0, -1), steps })
      else if (word.startsWith('=')) append(byForm, formOf(word.slice(1)), steps)
      else append(byStem, stemOf(formOf(word)), steps)
    }
  }
  return ({ words, byStem: stems, byForm: forms }) => {
    const ends = new Map<number, number>()
    const look = (starts: readonly number[] | undefined, candidates: readonly Step[][]) => {
      for (const first of starts ?? []) {
        const last = longest(words, first, candidates)
        if (last > (ends.get(first) ?? -1)) ends.set(first, last)
      }
    }
    for (const [stem, candidates] of byStem) look(stems.get(stem), candidates)
    for (const [form, candidates] of byForm) look(forms.get(form), candidates)
    for (const { prefix, steps } of byPrefix) {
      for (const [form, starts] of forms) if (form.startsWith(prefix)) look(starts, [steps])
    }
    return leftmost(ends)
  }
}

/** Leftmost and longest: the "gear" inside "landing gear" is no hit of its own. */
function leftmost(ends: ReadonlyMap<number, number>): TermHit[] {
  const hits: TermHit[] = []
  for (const [first, last] of [...ends].sort(([a], [b]) => a - b)) {
    if (first > (hits.at(-1)?.last ?? -1)) hits.push({ first, last })
  }
  return hits
}

function append(map: Map<string, Step[][]>, key: string, steps: Step[]): void {
  const list = map.get(key)
  if (list) list.push(steps)
  else map.set(key, [steps])
}

function stepOf(token: string): Step {
  if (token === '..') return { kind: 'gap' }
  if (token === '_') return { kind: 'word', test: () => true }
  const tests = token.split('/').map(wordTest)
  return { kind: 'word', test: (word) => tests.some((test) => test(word)) }
}

function wordTest(token: string): WordTest {
  if (token.endsWith('*')) {
    const prefix = token.slice(0, -1)
    return (word) => word.form.startsWith(prefix)
  }
  if (token.startsWith('=')) {
    const form = formOf(token.slice(1))
    return (word) => word.form === form
  }
  const stem = stemOf(formOf(token))
  return (word) => word.stem === stem
}

/** Index of the last word of the longest term that starts at `first`, or -1. */
function longest(words: readonly TradeWord[], first: number, candidates: readonly Step[][]): number {
  let best = -1
  for (const steps of candidates) best = Math.max(best, endOf(words, first, steps, 0))
  return best
}

/** Index of the word that ends the term, or -1. A term never runs past its sentence, a gap never past three words. */
function endOf(words: readonly TradeWord[], at: number, steps: readonly Step[], step: number): number {
  const next = steps[step]
  if (!next) return at
  const limit = next.kind === 'gap' ? LONGEST_GAP : 0
  const wanted = next.kind === 'gap' ? steps[step + 1] : next
  const following = next.kind === 'gap' ? step + 2 : step + 1
  if (!wanted || wanted.kind === 'gap') return at
  for (let skipped = 0; skipped <= limit; skipped += 1) {
    const index = at + 1 + skipped
    const word = words[index]
    if (!word || word.sentence !== words[at]?.sentence) return -1
    if (wanted.test(word)) {
      const end = endOf(words, index, steps, following)
      if (end >= 0) return end
    }
  }
  return -1
}
