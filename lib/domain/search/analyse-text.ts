// From a text to the terms that are indexed and searched: the same for entries and for questions, or nothing would be found.
// Stems are Porter's (the stemmer package); numbers and designations are designations.ts.
import { stemmer } from 'stemmer'
import { findSpacedDesignations, isUnit, spellChunk } from './designations'
import { anyStepTerm, exactStepTerm, findPlansReferences } from './plans-reference'
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

/** Stem of a normalised word. */
export function stemOf(word: string): string {
  return readingOf(word).term
}

interface Reading { stopped: boolean; term: string; word: string; kind: 'word' | 'unit' }

/** Words as written and what was made of them: a corpus repeats its words, and reading them is most of the work of indexing. */
const readings = new Map<string, Reading>()
const mostReadings = 100_000

function readingOf(raw: string): Reading {
  const known = readings.get(raw)
  if (known) return known
  if (readings.size >= mostReadings) readings.clear()
  const reading = readAnew(raw)
  readings.set(raw, reading)
  return reading
}

function readAnew(raw: string): Reading {
  const written = normaliseWord(raw.replace(/^[#.]+/, ''))
  const word = written.replace(/'s$/, '').replaceAll("'", '')
  if (word === '' || word.length > longestTerm) return { stopped: false, term: '', word: '', kind: 'word' }
  const unit = isUnit(word)
  return { stopped: isStopWord(written), term: unit ? word : stemmer(word), word, kind: unit ? 'unit' : 'word' }
}

/** Lower case, compatibility forms and accents removed: ﬂ, é and É become fl, e, e. */
export function normaliseWord(raw: string): string {
  const plain = /^[\x20-\x7e]*$/.test(raw) ? raw : raw.normalize('NFKD').replace(/[\p{M}\s]+/gu, '').replaceAll('⁄', '/').replaceAll('’', "'")
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
  const joined = parts.map((part) => part.raw).join('')
  if (hyphened && parts.some((part) => part.raw.length === 1)) {
    const long = parts.map((part) => readingOf(part.raw)).filter(({ word, stopped }) => word.length > 2 && !stopped).map(({ term }) => term)
    push(analysis, joined, long, start, start + raw.length)
    return
  }
  for (const part of parts) readWord(part.raw, part.start, analysis)
  const last = analysis.tokens.at(-1)
  const { term } = readingOf(joined.slice(0, longestTerm + 1))
  if (hyphened && parts.length > 1 && last && last.start >= start && term !== '') {
    analysis.tokens[analysis.tokens.length - 1] = { ...last, also: [...last.also, term] }
  }
}

function readWord(raw: string, start: number, analysis: Analysis): void {
  // Longer than any word could be, accents and all: not worth remembering.
  if (raw.length > 4 * longestTerm) return
  if (readingOf(raw).stopped) analysis.stopped.push(raw)
  else push(analysis, raw, nothing, start, start + raw.length)
}

const nothing: readonly string[] = []

function push(analysis: Analysis, raw: string, also: readonly string[], start: number, end: number): void {
  const { term, word, kind } = readingOf(raw)
  if (term !== '') analysis.tokens.push({ term, also, kind, word, start, end })
}

/** "step 6" is also one term, and with its page two more, so that a plans reference finds its step and not every six. */
function joinSteps(analysis: Analysis): Analysis {
  for (const [index, token] of analysis.tokens.entries()) {
    const before = analysis.tokens[index - 1]
    if (before?.term === 'step' && token.kind === 'number' && /^\d{1,3}[a-z]?$/.test(token.term)) {
      analysis.tokens[index] = { ...token, also: [...token.also, `step${token.term}`] }
    }
  }
  for (const { page, step, number } of findPlansReferences(analysis.tokens)) {
    const token = analysis.tokens[number]
    if (token) analysis.tokens[number] = { ...token, also: [...token.also, exactStepTerm(page, step), anyStepTerm(page)] }
  }
  return analysis
}
