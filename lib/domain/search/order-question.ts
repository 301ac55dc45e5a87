// Whether a question asks which of two things comes first, and what stands on its two sides. Grammar only: which tasks the sides
// name is task-names.ts. Words of order are stop words everywhere else.

export interface OrderSides { left: string; right: string }

const both = /\b(?:before\s*(?:or|and|\/)\s*after|after\s*(?:or|and|\/)\s*before)\b/
const asksWhichFirst = /\b(?:first|last|earlier|later|before|after)\b/
const either = /\b(?:or|vs|versus)\b/
/** To order parts is something else. */
const asksSequence = /\b(?:order|sequence) of\b|\b(?:what|which|right|best|correct|proper) (?:order|sequence)\b|\b(?:order|sequence)\W*$|\bfirst\b.*\b(?:and|then)\b/
const together = /\b(?:and then|and|then|or|vs|versus)\b/
/** What asks for the order and is about nothing, once it is known that an order is asked for. */
const orderWords = new Set(['first', 'last', 'earlier', 'later', 'order', 'sequence', 'comes', 'goes'])
const relation = /\b(?:before|prior to|ahead of|in advance of|after|then)\b/
/** A question about order is short; a long text that holds such a word tells a story. */
const longest = 200

/** The ways to read `text` as a question of order, likeliest first; empty when it is none. Never throws. */
export function readOrderSides(text: string): OrderSides[] {
  if (text.length > longest) return []
  const plain = text.toLowerCase().replaceAll('’', "'")
  return [
    splitAt(plain, both),
    asksWhichFirst.test(plain) ? splitAt(plain, either) : null,
    splitAt(plain, relation),
    asksSequence.test(plain) ? splitAt(plain, together) : null,
  ].filter((sides) => sides !== null)
}

/** The words of `text` that only ask for an order: none where two things are not set against one another. */
export function isAskedAround(text: string): (word: string) => boolean {
  const plain = text.length > longest ? '' : text.toLowerCase()
  const asks = (asksWhichFirst.test(plain) && splitAt(plain, either)) || (asksSequence.test(plain) && splitAt(plain, together))
  return asks ? (word) => orderWords.has(word) : () => false
}

function splitAt(text: string, separator: RegExp): OrderSides | null {
  const match = separator.exec(text)
  if (!match) return null
  const [left, right] = [text.slice(0, match.index), text.slice(match.index + match[0].length)]
  return left.trim() === '' || right.trim() === '' ? null : { left, right }
}
