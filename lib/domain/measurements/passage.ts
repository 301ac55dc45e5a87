// A text with its lexemes, and the questions every reader asks of its neighbours.
import { lexemesOf, type Lexeme } from './lexemes'

export interface Passage { text: string; lexemes: readonly Lexeme[]; /** Places of quotation marks that close a quotation, and so mean no inch. */ closingQuotes: ReadonlySet<number> }

const noQuotes: ReadonlySet<number> = new Set()

export function passageOf(text: string): Passage {
  const lexemes = lexemesOf(text)
  return { text, lexemes, closingQuotes: /["”]/.test(text) ? closingQuotes(lexemes) : noQuotes }
}

/** The word at a place, lower case, or ''. */
export function wordAt(passage: Passage, at: number): string {
  const lexeme = passage.lexemes[at]
  return lexeme?.type === 'word' ? lexeme.text : ''
}

/** The sign at a place, or ''. */
export function signAt(passage: Passage, at: number): string {
  const lexeme = passage.lexemes[at]
  return lexeme?.type === 'sign' ? lexeme.text : ''
}

export function numberAt(passage: Passage, at: number): Lexeme | undefined {
  const lexeme = passage.lexemes[at]
  return lexeme && isNumber(lexeme) ? lexeme : undefined
}

export const isNumber = ({ type }: Lexeme): boolean => type === 'whole' || type === 'decimal' || type === 'fraction'

/** No white between this lexeme and the one before. */
export const isAttached = (passage: Passage, at: number): boolean => at > 0 && passage.lexemes[at]?.gap === 0

const abbreviations = new Set(['dist', 'dia', 'diam', 'approx', 'min', 'max', 'rad', 'thk', 'alum', 'ctr', 'ctrs', 'no'])

/** The nearest word in front of a place within a few lexemes of the same sentence that passes. */
export function hasWordBefore(passage: Passage, at: number, within: number, accepted: ReadonlySet<string>): boolean {
  for (let place = at - 1; place >= 0 && place >= at - within; place -= 1) {
    const sign = signAt(passage, place)
    if ((sign === '.' && !abbreviations.has(wordAt(passage, place - 1))) || sign === ';' || sign === '?' || sign === '!') return false
    if (accepted.has(wordAt(passage, place))) return true
  }
  return false
}

/** The first lexeme that begins at or behind an offset, from a place on. */
export function placeAfter(passage: Passage, at: number, offset: number): number {
  let place = at
  for (let lexeme = passage.lexemes[place]; lexeme && lexeme.start < offset; lexeme = passage.lexemes[place]) place += 1
  return place
}

const longestQuotation = 200

/** A mark behind a digit ends a quotation if one is open and no later mark ends it. Two passes, linear. */
function closingQuotes(lexemes: readonly Lexeme[]): ReadonlySet<number> {
  const marks: { place: number; start: number; role: 'opens' | 'closes' | 'inch or closes' }[] = []
  for (let place = 0; place < lexemes.length; place += 1) {
    const lexeme = lexemes[place]
    if (lexeme?.type !== 'sign' || (lexeme.text !== '"' && lexeme.text !== '“' && lexeme.text !== '”')) continue
    const before = lexemes[place - 1]
    const next = lexemes[place + 1]
    const opens = lexeme.text === '“' || (lexeme.text === '"' && (lexeme.gap > 0 || !before || isBracket(before)) && next?.gap === 0)
    marks.push({ place, start: lexeme.start, role: opens ? 'opens' : before && isNumber(before) && lexeme.gap === 0 ? 'inch or closes' : 'closes' })
  }
  const closing = new Set<number>()
  let later = Infinity
  const closerAfter: number[] = []
  for (let index = marks.length - 1; index >= 0; index -= 1) {
    closerAfter[index] = later
    const mark = marks[index]
    if (mark?.role === 'opens') later = Infinity
    if (mark?.role === 'closes') later = mark.start
  }
  let opened = -Infinity
  for (const [index, mark] of marks.entries()) {
    if (mark.role === 'opens') opened = mark.start
    else if (mark.role === 'closes') opened = -Infinity
    else if (mark.start - opened <= longestQuotation && (closerAfter[index] ?? Infinity) - opened > longestQuotation) {
      closing.add(mark.place)
      opened = -Infinity
    }
  }
  return closing
}

const isBracket = (lexeme: Lexeme): boolean => lexeme.type === 'sign' && (lexeme.text === '(' || lexeme.text === '[')
