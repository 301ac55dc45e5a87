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

/** The terms that share a head, by their second word: few of the many that begin with "the" go on as the text does. */
interface Head {
  alone: boolean
  byStem: Map<string, Step[][]>
  byForm: Map<string, Step[][]>
  /** Terms that go on with a gap, a choice, a beginning or any word: tried one by one, from their second step. */
  others: Step[][]
}

/** Compiles terms to a matcher. Hits come in text order and never overlap; an empty list of terms finds nothing. */
export function compileTerms(terms: readonly string[]): TermMatcher {
  const byStem = new Map<string, Head>()
  const byForm = new Map<string, Head>()
  const byPrefix = new Map<string, Head>()
  for (const term of terms) {
    const [head = '', ...rest] = term.toLowerCase().split(/\s+/)
    for (const word of head.split('/')) {
      if (word.endsWith('*')) addTerm(byPrefix, word.slice(0, -1), rest)
      else if (word.startsWith('=')) addTerm(byForm, formOf(word.slice(1)), rest)
      else addTerm(byStem, stemOf(formOf(word)), rest)
    }
  }
  return ({ words, byStem: stems, byForm: forms }) => {
    const ends = new Map<number, number>()
    const look = (starts: readonly number[] | undefined, head: Head) => {
      for (const first of starts ?? []) {
        const last = longest(words, first, head)
        if (last > (ends.get(first) ?? -1)) ends.set(first, last)
      }
    }
    for (const [stem, head] of byStem) look(stems.get(stem), head)
    for (const [form, head] of byForm) look(forms.get(form), head)
    for (const [prefix, head] of byPrefix) {
      for (const [form, starts] of forms) if (form.startsWith(prefix)) look(starts, head)
    }
    return leftmost(ends)
  }
}

function addTerm(heads: Map<string, Head>, key: string, rest: readonly string[]): void {
  const head = heads.get(key) ?? { alone: false, byStem: new Map<string, Step[][]>(), byForm: new Map<string, Step[][]>(), others: [] }
  heads.set(key, head)
  const [second, ...more] = rest
  if (second === undefined) head.alone = true
  else if (second === '..' || second === '_' || second.endsWith('*') || second.includes('/')) head.others.push(rest.map(stepOf))
  else if (second.startsWith('=')) append(head.byForm, formOf(second.slice(1)), more.map(stepOf))
  else append(head.byStem, stemOf(formOf(second)), more.map(stepOf))
}

/** Leftmost and longest: the "gear" inside "landing gear" is no hit of its own. */
function leftmost(ends: ReadonlyMap<number, number>): TermHit[] {
  const hits: TermHit[] = []
  let reached = -1
  for (const first of [...ends.keys()].sort((a, b) => a - b)) {
    const last = ends.get(first) ?? first
    if (first <= reached) continue
    hits.push({ first, last })
    reached = last
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
  const [only] = tests
  // Nearly every step is one word: a call saved for each word of a long text.
  return { kind: 'word', test: only && tests.length === 1 ? only : (word) => tests.some((test) => test(word)) }
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
function longest(words: readonly TradeWord[], first: number, head: Head): number {
  let best = head.alone ? first : -1
  for (const steps of head.others) best = Math.max(best, endOf(words, first, steps, 0))
  const second = words[first + 1]
  if (!second || second.sentence !== words[first]?.sentence) return best
  for (const steps of head.byStem.get(second.stem) ?? []) best = Math.max(best, endOf(words, first + 1, steps, 0))
  for (const steps of head.byForm.get(second.form) ?? []) best = Math.max(best, endOf(words, first + 1, steps, 0))
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
