// The piece of a text that shows best why it was found, with the places to mark. Pure.

export interface Snippet {
  snippet: string
  /** [start, end) in UTF-16 units of `snippet`; ascending, never overlapping. */
  marks: [number, number][]
}

interface Range { start: number; end: number }

const ellipsis = '…'
const wordCharacter = /[\p{L}\p{N}\p{M}]/u
/** More terms than a reader could tell apart only cost time. */
const mostTerms = 64

/**
 * Chooses the window of `plain` that holds the most different terms (then the most matches, then the earliest) and marks them.
 * Words stay whole unless one alone is longer than the window; surrogate pairs are never cut. White space comes out as single spaces.
 * @param terms words as they stand in the text, any case; phrases may hold spaces
 * @param maxLength most UTF-16 units of `snippet`, ellipses included; at least 20
 */
export function makeSnippet(plain: string, terms: readonly string[], maxLength = 220): Snippet {
  const text = plain.replace(/\s+/gu, ' ').trim()
  const room = Math.max(20, maxLength)
  const matches = findMatches(text, terms)
  if (text.length <= room) return { snippet: text, marks: marksWithin(matches, { start: 0, end: text.length }, 0) }
  const window = trimWindow(text, bestWindow(text, matches, room - 2))
  const before = window.start > 0 ? ellipsis : ''
  const after = window.end < text.length ? ellipsis : ''
  return {
    snippet: before + text.slice(window.start, window.end) + after,
    marks: marksWithin(matches, window, before.length - window.start),
  }
}

interface Match extends Range { term: number }

/** Every place where a term stands as a whole word, ascending, longest first, without overlaps. */
function findMatches(text: string, terms: readonly string[]): Match[] {
  const wanted = [...new Set(terms.map((t) => t.replace(/\s+/gu, ' ').trim().toLowerCase()))].filter((t) => t !== '').slice(0, mostTerms)
  if (wanted.length === 0) return []
  const longestFirst = [...wanted].sort((a, b) => b.length - a.length)
  const pattern = new RegExp(longestFirst.map(escapeForPattern).join('|'), 'giu')
  const found: Match[] = []
  for (let match = pattern.exec(text); match !== null; match = pattern.exec(text)) {
    const range = { start: match.index, end: match.index + match[0].length }
    if (isWhole(text, range)) found.push({ ...range, term: wanted.indexOf(match[0].toLowerCase()) })
    // A longer term that failed here may hide a shorter one that begins a letter later.
    else pattern.lastIndex = match.index + (match[0].length === 0 ? 1 : widthAt(text, match.index))
  }
  return found
}

function isWhole(text: string, { start, end }: Range): boolean {
  const first = characterAt(text, start)
  const last = characterBefore(text, end)
  const clearBefore = !(wordCharacter.test(first) && wordCharacter.test(characterBefore(text, start)))
  const clearAfter = !(wordCharacter.test(last) && wordCharacter.test(characterAt(text, end)))
  return clearBefore && clearAfter
}

/** The window of at most `room` units with the most different terms; it begins a little before its first match. */
function bestWindow(text: string, matches: readonly Match[], room: number): Range {
  let best = { start: 0, end: room, different: 0, all: 0 }
  for (let from = 0; from < matches.length; from++) {
    const first = matches[from]
    if (!first) break
    const inside = matches.slice(from, from + 40).filter((m) => m.end <= first.start + room)
    const different = new Set(inside.map((m) => m.term)).size
    if (different < best.different || (different === best.different && inside.length <= best.all)) continue
    const lastEnd = inside.at(-1)?.end ?? Math.min(first.end, first.start + room)
    const spare = room - (lastEnd - first.start)
    const start = Math.max(0, Math.min(first.start - Math.floor(spare / 2), text.length - room))
    best = { start, end: start + room, different, all: inside.length }
  }
  return { start: best.start, end: Math.min(text.length, best.end) }
}

/** Moves both ends inwards to the edge of a word, unless that would leave nothing, and off the middle of a surrogate pair. */
function trimWindow(text: string, window: Range): Range {
  let { start, end } = window
  if (start > 0 && characterBefore(text, start) !== ' ') {
    const space = text.indexOf(' ', start)
    if (space !== -1 && space + 1 < end) start = space + 1
  }
  if (end < text.length && text[end] !== ' ') {
    const space = text.lastIndexOf(' ', end)
    if (space > start) end = space
  }
  if (isLowSurrogate(text, start) && start > 0) start++
  if (isLowSurrogate(text, end) && end < text.length) end--
  while (text[start] === ' ' && start < end) start++
  while (text[end - 1] === ' ' && end > start) end--
  return { start, end }
}

function marksWithin(matches: readonly Match[], window: Range, shift: number): [number, number][] {
  return matches.filter((m) => m.start >= window.start && m.end <= window.end).map((m) => [m.start + shift, m.end + shift])
}

const escapeForPattern = (term: string): string => term.replace(/[\\^$.*+?()[\]{}|/-]/gu, (c) => (c === '-' ? '\\x2d' : `\\${c}`))
const isLowSurrogate = (text: string, index: number): boolean => { const c = text.charCodeAt(index); return c >= 0xdc00 && c <= 0xdfff }
const widthAt = (text: string, index: number): number => ((text.codePointAt(index) ?? 0) > 0xffff ? 2 : 1)

function characterAt(text: string, index: number): string {
  const code = text.codePointAt(index)
  return code === undefined ? '' : String.fromCodePoint(code)
}

function characterBefore(text: string, index: number): string {
  if (index <= 0) return ''
  return characterAt(text, isLowSurrogate(text, index - 1) && index > 1 ? index - 2 : index - 1)
}
