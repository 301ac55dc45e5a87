// Cuts a Markdown text into sentences and marks what is somebody else's words: quotations, block quotes, code. One pass; no grammar beyond marks.

export interface Sentence {
  start: number
  end: number
  /** A new paragraph or list entry begins here: what was spoken of before is forgotten. */
  opens: boolean
  question: boolean
}

/** Longer ones are cut, so that the work on a sentence is bounded. */
const longest = 320
const abbreviations = new Set(['no', 'nr', 'approx', 'ca', 'vs', 'e.g', 'i.e', 'eg', 'ie', 'min', 'max', 'fig', 'ch', 'para', 'p', 'incl', 'resp', 'mr', 'mrs', 'dr', 'st'])
/** End a sentence before a capital letter only. */
const unitWords = new Set(['in', 'lb', 'lbs', 'ft', 'dia', 'diam', 'oz'])

/** Sentences in order, without overlaps. Quoted lines and code are left out. */
export function sentencesOf(text: string): Sentence[] {
  return blocksOf(text).flatMap(({ start, end }) => cutBlock(text, start, end))
}

/** Paragraphs, list entries and rows; fenced code and block quotes are passed over. */
function blocksOf(text: string): { start: number; end: number }[] {
  const blocks: { start: number; end: number }[] = []
  let open = -1
  let fenced = false
  const close = (end: number): void => {
    if (open >= 0) blocks.push({ start: open, end })
    open = -1
  }
  for (let at = 0; at < text.length;) {
    const newline = text.indexOf('\n', at)
    const lineEnd = newline < 0 ? text.length : newline
    const head = text.slice(at, Math.min(lineEnd, at + 60)).trimStart()
    const fence = head.startsWith('```') || head.startsWith('~~~')
    if (fence) fenced = !fenced
    const apart = fence || fenced || head === '' || head.startsWith('>')
    if (apart || /^(?:[-*+•|] ?|\d{1,2}[.)] |#{1,6} )/.test(head)) close(at)
    if (!apart && open < 0) open = at
    at = lineEnd + 1
  }
  close(text.length)
  return blocks
}

function cutBlock(text: string, start: number, end: number): Sentence[] {
  const sentences: Sentence[] = []
  let from = start
  const push = (to: number, question: boolean): void => {
    if (to > from) sentences.push({ start: from, end: to, opens: sentences.length === 0, question })
    from = to
  }
  for (let at = start; at < end; at += 1) {
    const sign = text.charAt(at)
    if ((sign === '.' || sign === '!' || sign === '?') && endsSentence(text, at, end)) push(at + 1, sign === '?')
    else if (sign === ';') push(at + 1, false)
    else if (at - from >= longest && /\s/.test(sign)) push(at, false)
    else if (at - from >= 2 * longest) push(at, false)
  }
  push(end, false)
  return sentences
}

function endsSentence(text: string, at: number, end: number): boolean {
  const next = text.charAt(at + 1)
  if (at + 1 < end && !/[\s"”’')\]]/.test(next)) return false
  if (text.charAt(at) !== '.') return true
  const word = /[A-Za-z.]{1,6}$/.exec(text.slice(Math.max(0, at - 6), at))?.[0].toLowerCase() ?? ''
  if (abbreviations.has(word)) return false
  return !unitWords.has(word) || at + 2 >= end || /[\p{Lu}\n]/u.test(text.slice(at + 1, at + 4).trimStart().charAt(0) || '\n')
}

/** Spans between quotation marks and in code spans. An inch mark behind a digit opens nothing. */
export function quotedSpans(text: string): { start: number; end: number }[] {
  const spans: { start: number; end: number }[] = []
  let open = -1
  let closer = ''
  for (let at = 0; at < text.length; at += 1) {
    const sign = text.charAt(at)
    if (open >= 0 && (sign === closer || sign === '\n' || at - open > 2 * longest)) {
      if (sign === closer && !(closer === '"' && isInchMark(text, at, open))) {
        // A letter in quotation marks is a drill's name and not somebody's words.
        if (at - open > 2) spans.push({ start: open, end: at + 1 })
      }
      else if (sign === closer) continue
      open = -1
    } else if (open < 0) {
      closer = opener(text, at, sign)
      if (closer) open = at
    }
  }
  return spans
}

const pairs: Record<string, string> = { '“': '”', '«': '»', '`': '`', '"': '"', '‘': '’', "'": "'" }

function opener(text: string, at: number, sign: string): string {
  const close = pairs[sign]
  if (!close) return ''
  if (sign !== '"' && sign !== "'" && sign !== '‘') return close
  const before = text.charAt(at - 1)
  const behind = text.charAt(at + 1)
  return (at === 0 || /[\s(\[:,]/.test(before)) && /\S/.test(behind) ? close : ''
}

/** `"drill 1/4" and so on"`: a mark behind a digit with a later mark on the same line is an inch. */
function isInchMark(text: string, at: number, open: number): boolean {
  if (!/\d/.test(text.charAt(at - 1))) return false
  const later = text.indexOf('"', at + 1)
  return later > 0 && later - open <= longest && !/[\n“]/.test(text.slice(at, later)) && !/\s/.test(text.charAt(later - 1))
}
