// Drills by number (#30, No. 30, number thirty) and by letter (letter F drill, an F drill, size F), told from screws, wires and places in a row.
import { drillNamed, numberDrill } from './drill-sizes'
import { nothing, sized, wireGauge, type Finding } from './make-measurement'
import { hasWordBefore, isAttached, numberAt, signAt, wordAt, type Passage } from './passage'
import { readWholeWords, type NumberRead } from './read-number'
import { readThread } from './read-thread'
import { labelBefore } from './stands-free'
import { drillNouns, drillVerbs, labels, otherQuantities, placeNouns, screwAdjectives, screwNouns, wireNouns } from './surroundings'

interface Naming { from: number; at: number; number: number; next: number; /** How sure the way of naming is by itself. */ sure: 'sign' | 'abbreviation' | 'word' | 'no' }

/** What a number sign begins: a drill, a thread, a wire; or nothing, past its number. */
export function readNumberSign(passage: Passage, at: number): Finding | undefined {
  const number = numberAt(passage, at + 1)
  if (number?.type !== 'whole' || (passage.lexemes[at + 1]?.gap ?? 2) === 2) return undefined
  const thread = readThread(passage, at + 1, at)
  if (thread) return thread
  const glued = isAttached(passage, at + 2) && (passage.lexemes[at + 2]?.type === 'word' && wordAt(passage, at + 2) !== 's')
  const counted = signAt(passage, at + 2) === '-' && isAttached(passage, at + 2) && isAttached(passage, at + 3) && numberAt(passage, at + 3) !== undefined
  if (glued || counted || number.text.startsWith('0')) return nothing(at + 2)
  return judge(passage, { from: at, at: at + 1, number: number.n, next: at + 2, sure: 'sign' })
}

/** What "number", "No." or "no" begins. */
export function readNumberWord(passage: Passage, at: number): Finding | undefined {
  const word = wordAt(passage, at)
  const point = signAt(passage, at + 1) === '.' && word !== 'number'
  const hyphen = signAt(passage, at + 1) === '-' && isAttached(passage, at + 1)
  const place = point || hyphen ? at + 2 : at + 1
  if ((passage.lexemes[place]?.gap ?? 2) === 2) return undefined
  const number = numberAt(passage, place)
  const spoken = number ? undefined : readWholeWords(passage, place)
  if (number && (number.type !== 'whole' || number.text.startsWith('0'))) return undefined
  const value = number?.n ?? spoken?.value
  if (value === undefined) return undefined
  const next = spoken?.next ?? place + 1
  if (number && readThread(passage, place)) return readThread(passage, place, at)
  if (signAt(passage, next) === '-' && isAttached(passage, next) && numberAt(passage, next + 1)) return nothing(next + 2)
  return judge(passage, { from: at, at: place, number: value, next, sure: word === 'number' ? 'word' : point ? 'abbreviation' : word === 'no' ? 'no' : 'word' })
}

function judge(passage: Passage, naming: Naming): Finding {
  const { from, number, next } = naming
  const label = labelBefore(passage, from)
  if (wireNouns.has(wordBehind(passage, next))) {
    const behind = gaugeNouns.has(wordAt(passage, next)) ? next + 1 : next
    return number <= 40 && !labels.has(label) ? { measurements: [wireGauge(passage, from, behind, number)], next: behind } : nothing(next)
  }
  const drill = numberDrill(number)
  if (!drill || labels.has(label) || namesScrewOrPlace(passage, next, number) || !isLikely(passage, naming)) return nothing(next)
  return { measurements: [sized(passage, from, next, 'drill', drill, drill.name)], next }
}

const gaugeNouns = new Set(['awg', 'gauge', 'gage'])

/** Small numbers are mostly places in a row, and "no 30" may count: they need a drill beside them. */
function isLikely(passage: Passage, { from, number, next, sure }: Naming): boolean {
  const after = wordBehind(passage, next)
  const beside = drillNouns.has(after) || hasWordBefore(passage, from, 6, drillVerbs)
  if (number < 10 || sure === 'no') return beside && !otherQuantities.has(after) && !(sure === 'no' && /[^s]s$/.test(after) && !drillNouns.has(after))
  return !otherQuantities.has(after) || (after === 's' && isAttached(passage, next))
}

const drillCompounds = new Set(['press', 'presses', 'bit', 'bits', 'bushing', 'bushings', 'stop', 'stops', 'guide', 'guides', 'motor', 'motors', 'chuck', 'chucks', 'block', 'blocks', 'set', 'sets'])
const dataWidths = new Set([8, 12, 16, 24, 32, 64])

/** A 30 drill, the 21 bit: in the singular the number names the tool. "Two 30 drills" and "12 drills" are counted. */
export function readUnsignedDrill(passage: Passage, { form, n, from, next, text }: NumberRead): Finding | undefined {
  const place = signAt(passage, next) === '-' && isAttached(passage, next) ? next + 1 : next
  const noun = wordAt(passage, place)
  if (form !== 'whole' || n < 10 || text.startsWith('0') || passage.lexemes[place]?.gap === 2) return undefined
  if (!(noun === 'drill' || noun === 'reamer' || (noun === 'bit' && !dataWidths.has(n))) || drillCompounds.has(wordAt(passage, place + 1))) return undefined
  const drill = numberDrill(n)
  return drill && { measurements: [sized(passage, from, place + 1, 'drill', drill, drill.name)], next: place + 1 }
}

const screwSizes = new Set([0, 2, 4, 5, 6, 8, 10, 12, 14])
const mostWordsAhead = 8

function namesScrewOrPlace(passage: Passage, next: number, number: number): boolean {
  if (placeNouns.has(wordAt(passage, next)) && !(number >= 10 && ['in', 'on', 'of', 'place'].includes(wordAt(passage, next)))) return true
  for (let place = signAt(passage, next) === '-' ? next + 1 : next; place < next + mostWordsAhead; place += 1) {
    const word = wordAt(passage, place)
    if (screwNouns.has(word)) return true
    // #8 and #10 screws share their noun.
    const shared = screwSizes.has(number) && (['and', 'or'].includes(word) || ['#', ',', '/', '-'].includes(signAt(passage, place)) || numberAt(passage, place) !== undefined)
    if (!screwAdjectives.has(word) && !shared) return false
  }
  return false
}

const quotes = new Set(['"', '“', '”', "'", '‘', '’'])

/** An "F" drill. */
export function readQuotedLetter(passage: Passage, at: number): Finding | undefined {
  const drill = quotes.has(signAt(passage, at + 2)) && isAttached(passage, at + 1) && isAttached(passage, at + 2) ? drillNamed(capitalAt(passage, at + 1)) : undefined
  const noun = drill ? nounBehind(passage, at + 3) : 0
  return drill && noun > 0 ? { measurements: [sized(passage, at, noun, 'drill', drill, drill.name)], next: noun } : undefined
}

/** What "letter" or "size" begins, the noun behind included: letter F drill, size F. */
export function readLetterWord(passage: Passage, at: number): Finding | undefined {
  const word = wordAt(passage, at)
  const place = quotes.has(signAt(passage, at + 1)) || (signAt(passage, at + 1) === '-' && isAttached(passage, at + 1)) ? at + 2 : at + 1
  const behind = quotes.has(signAt(passage, place + 1)) && isAttached(passage, place + 1) && quotes.has(signAt(passage, place - 1)) ? place + 2 : place + 1
  const letter = capitalAt(passage, place)
  const noun = nounBehind(passage, behind)
  const drill = letter === '' ? (noun > 0 ? drillNamed(lowerLetter(passage, place)) : undefined) : drillNamed(letter)
  if (!drill) return undefined
  if (noun === 0 && !isDrillLetter(passage, at, behind, word)) return undefined
  const next = noun > 0 ? noun : behind
  return { measurements: [sized(passage, at, next, 'drill', drill, drill.name)], next }
}

/** An F drill, a Q bit: a lone capital with its noun. "A drill" and "I drill" are English. */
export function readLoneLetter(passage: Passage, at: number): Finding | undefined {
  const letter = capitalAt(passage, at)
  const noun = nounBehind(passage, at + 1)
  if (letter === '' || letter === 'A' || letter === 'I' || noun === 0 || (isAttached(passage, at) && signAt(passage, at - 1) !== '(')) return undefined
  // An 18 V drill, a 600 W drill: what drives it.
  if ((letter === 'V' || letter === 'W') && numberAt(passage, at - 1)) return undefined
  const drill = drillNamed(letter)
  return drill && { measurements: [sized(passage, at, noun, 'drill', drill, drill.name)], next: noun }
}

const notDrillLetter = new Set(['on', 'of', 'in', 'from', 'means', 'stands', 'at', 'to', 'battery', 'batteries', 'cell', 'cells', 'shirt', 'gloves', 'screw', 'screws', 'paper'])
const beforeLetters = new Set(['revision', 'rev', 'serial', 'suffix', 'code', 'section', 'capital', 'by', 'see', 'drawing', 'bulletin', 'dash'])

function isDrillLetter(passage: Passage, at: number, next: number, word: string): boolean {
  if (wordAt(passage, next) === 'is' && !numberAt(passage, next + 1)) return false
  if (notDrillLetter.has(wordAt(passage, next)) || beforeLetters.has(wordAt(passage, at - 1))) return false
  return word === 'letter' || hasWordBefore(passage, at, 3, drillVerbs)
}

const letterNouns = new Set(['drill', 'drills', 'bit', 'bits', 'reamer'])

/** The place behind a drill's noun, or 0. */
function nounBehind(passage: Passage, at: number): number {
  const place = signAt(passage, at) === '-' && isAttached(passage, at) ? at + 1 : at
  return letterNouns.has(wordAt(passage, place)) && passage.lexemes[place]?.gap !== 2 ? place + 1 : 0
}

function capitalAt(passage: Passage, at: number): string {
  const lexeme = passage.lexemes[at]
  const text = lexeme?.type === 'word' && lexeme.end - lexeme.start === 1 ? passage.text.charAt(lexeme.start) : ''
  return text >= 'A' && text <= 'Z' ? text : ''
}

const lowerLetter = (passage: Passage, at: number): string => {
  const word = wordAt(passage, at)
  return word.length === 1 ? word.toUpperCase() : ''
}

const wordBehind = (passage: Passage, at: number): string => wordAt(passage, signAt(passage, at) === '-' ? at + 1 : at)
