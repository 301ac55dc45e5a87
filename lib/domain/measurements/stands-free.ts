// Whether a number stands by itself or is a piece of something longer: of W3-2, 4:1, 555-0123, Table 7-1, step 6.
import { isAttached, numberAt, signAt, wordAt, type Passage } from './passage'
import type { NumberRead } from './read-number'
import { fractionLabels, labels } from './surroundings'

const joiningWords = new Set(['x', 'by', 'to', 'of', 'is', 'and', 'or', 'at', 'dia', 'diam', 'approx', 'ca', 'about', 'r', 'd'])
const pieces = new Set(['-', '–', '/', ':', '_', '@', '&', '\\'])

/** False for a number glued to a name, a clock or another number. */
export function standsFree(passage: Passage, at: number, form: NumberRead['form']): boolean {
  const before = passage.lexemes[at - 1]
  if ('$€£'.includes(signAt(passage, at - 1) || ' ')) return false
  if (!before || !isAttached(passage, at)) return true
  if (before.type === 'word') return joiningWords.has(before.text)
  if (before.type !== 'sign') return false
  if (!pieces.has(before.text)) return before.text !== '.' || numberAt(passage, at - 2) === undefined
  // .032/.040 and 1/4"/3/8" are two; spar-3/16 is one; a dash behind a space only sets it off.
  if (!isAttached(passage, at - 1)) return before.text === '-' || before.text === '–' || before.text === '~'
  const earlier = passage.lexemes[at - 2]
  // ±, as typed.
  if (before.text === '-' && earlier?.text === '/' && signAt(passage, at - 3) === '+') return true
  if (before.text === '/') return form === 'decimal' || earlier?.type === 'sign'
  return form !== 'whole' && (before.text === '-' || before.text === '–') && earlier?.type === 'word' && earlier.text.length > 3
}

/** Step 6, page 12, Table 7-1, sheet 3/4: the number is a name. A decimal without a whole never is one. */
export function isLabelled(passage: Passage, at: number, number: NumberRead): boolean {
  if (number.text.startsWith('.') || number.form === 'words') return false
  const word = labelBefore(passage, at)
  return number.form === 'fraction' ? fractionLabels.has(word) : labels.has(word)
}

const steppingOver = new Set(['no', 'nr', 'number', 'nos'])

/** The word in front of a number, over "no.", "#" and "§". */
export function labelBefore(passage: Passage, at: number): string {
  let place = at - 1
  for (let steps = 0; steps < 3; steps += 1) {
    const sign = signAt(passage, place)
    if (sign !== '#' && sign !== '.' && sign !== '§' && !steppingOver.has(wordAt(passage, place))) break
    place -= 1
  }
  return wordAt(passage, place)
}
