// From a text to the terms that are indexed and searched: the same for entries and for questions, or nothing would be found.
// Stems are Porter's (the stemmer package); numbers and designations are designations.ts.
import { stemmer } from 'stemmer'
import { findSpacedDesignations, isUnit, spellChunk, type Spelling } from './designations'
import { isStopWord } from './stop-words'

export interface Token {
  /** What is looked up: a stem, or the one spelling of a number or designation. */
  term: string
  /** Broader or joined spellings that stand at the same place. */
  also: readonly string[]
  kind: 'word' | 'number' | 'unit'
  /** The normalised word before stemming; '' for numbers. */
  word: string
  /** Place in the text, UTF-16. */
  start: number
  end: number
}

export interface Analysis {
  tokens: Token[]
  /** Stop words met, as written; a question of nothing else has nothing to search. */
  stopped: string[]
}

const chunk = /#?\.?[\p{L}\p{N}][\p{L}\p{N}\p{M}]*(?:['’.,/·–-][\p{L}\p{N}\p{M}]+)*/gu
/** Longer runs of letters are no words. */
const longestTerm = 40

/** Tokens in the order of the text. Linear in its length; never throws. */
export function analyseText(text: string): Analysis {
  const analysis: Analysis = { tokens: [], stopped: [] }
  const spaced = findSpacedDesignations(text)
  let next = 0
  for (const match of text.matchAll(chunk)) {
    const start = match.index
    for (let found = spaced[next]; found && found.start <= start; found = spaced[++next]) {
      analysis.tokens.push({ ...found.spelling, kind: 'number', word: '', start: found.start, end: found.end })
    }
    const inside = spaced[next - 1]
    if (inside && start < inside.end) continue
    readChunk(match[0], start, analysis)
  }
  return joinSteps(analysis)
}

/** Stem of a normalised word, remembered: a corpus repeats its words, and stemming is most of the work of indexing. */
export function stemOf(word: string): string {
  const known = stems.get(word)
  if (known !== undefined) return known
  if (stems.size >= 50_000) stems.clear()
  const stem = stemmer(word)
  stems.set(word, stem)
  return stem
}

const stems = new Map<string, string>()

/** Lower case, compatibility forms and accents removed: ﬂ, é and É become fl, e, e. */
export function normaliseWord(raw: string): string {
  const plain = /^[\x20-\x7e]*$/.test(raw) ? raw : raw.normalize('NFKD').replace(/\p{M}+/gu, '').replaceAll('⁄', '/').replaceAll('’', "'")
  return plain.toLowerCase()
}

function readChunk(raw: string, start: number, analysis: Analysis): void {
  if (/\p{N}/u.test(raw)) readNumber(raw, start, analysis)
  else if (/[.,/·–-]/.test(raw)) readCompound(raw, start, analysis)
  else readWord(raw, start, analysis)
}

function readNumber(raw: string, start: number, analysis: Analysis): void {
  const end = start + raw.length
  for (const spelling of spellChunk(normaliseWord(raw).replaceAll('–', '-').replaceAll("'", ''))) {
    if (spelling.term === '' || spelling.term.length > longestTerm) continue
    analysis.tokens.push({ ...spelling, kind: isUnit(spelling.term) ? 'unit' : 'number', word: '', start, end })
  }
}

/** match-drill is two words and one; where a part is a single letter (c-frame, n·m) it is one word first. */
function readCompound(raw: string, start: number, analysis: Analysis): void {
  const parts = [...raw.matchAll(/[^.,/·–-]+/gu)].map((m) => ({ raw: m[0], start: start + m.index }))
  const hyphened = /^[^.,/]+$/.test(raw) && parts.length <= 3
  const joined = normaliseWord(parts.map((part) => part.raw).join('')).replaceAll("'", '')
  if (hyphened && parts.some((part) => part.raw.length === 1)) {
    const long = parts.map((part) => normaliseWord(part.raw)).filter((word) => word.length > 2 && !isStopWord(word)).map(stemOf)
    push(analysis, joined, { also: long }, start, start + raw.length)
    return
  }
  for (const part of parts) readWord(part.raw, part.start, analysis)
  const last = analysis.tokens.at(-1)
  if (hyphened && parts.length > 1 && last && last.start >= start && joined.length <= longestTerm) {
    analysis.tokens[analysis.tokens.length - 1] = { ...last, also: [...last.also, isUnit(joined) ? joined : stemOf(joined)] }
  }
}

function readWord(raw: string, start: number, analysis: Analysis): void {
  const word = normaliseWord(raw.replace(/^[#.]+/, ''))
  if (isStopWord(word)) {
    analysis.stopped.push(raw)
    return
  }
  push(analysis, word.replace(/'s$/, '').replaceAll("'", ''), { also: [] }, start, start + raw.length)
}

function push(analysis: Analysis, word: string, { also }: Pick<Spelling, 'also'>, start: number, end: number): void {
  if (word === '' || word.length > longestTerm) return
  const unit = isUnit(word)
  analysis.tokens.push({ term: unit ? word : stemOf(word), also, kind: unit ? 'unit' : 'word', word, start, end })
}

/** "step 6" is also one term, so that a plans reference finds its step and not every six. */
function joinSteps(analysis: Analysis): Analysis {
  for (const [index, token] of analysis.tokens.entries()) {
    const before = analysis.tokens[index - 1]
    if (before?.term === 'step' && token.kind === 'number' && /^\d{1,3}[a-z]?$/.test(token.term)) {
      analysis.tokens[index] = { ...token, also: [...token.also, `step${token.term}`] }
    }
  }
  return analysis
}
