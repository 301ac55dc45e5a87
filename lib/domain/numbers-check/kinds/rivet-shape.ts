// The rivet itself: its length for a grip, and its driven head.
import rivets from '@/content/shop/rivets.json'
import { cite, COMMON_PRACTICE } from '../../shop/citation'
import { nearestStockLength, nextStockLength, rivetLength, shopHead } from '../../shop/rivet-rules'
import { decimalInches, length as lengthWords } from '../../shop/shop-result'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { behind, before, between, claims, dimensionOf, hasAny, isUnderOther, leadOf, nounOf, type Statement } from '../statement'
import { nearestSubject, spanOf, type Subject } from '../subjects'
import { rivetsOf, type Kind, type Scene } from './kind'

const headWords = /\b(?:tails?|(?:shop|driven|bucked|upset|formed|set|squeezed)[ -]?heads?|shop-head|buck-tails?)\b/

/** Width and height of the driven head, in inches or in diameters. */
export const drivenHead: Kind = (scene) => {
  const { statement } = scene
  if (!headWords.test(statement.text)) return []
  const taken = new Set(scene.subjects.flatMap(({ mark }) => (mark ? [mark] : [])))
  const values = claims(statement).filter((mark) => (mark.what === 'length' || mark.what === 'diameters') && !taken.has(mark) && !isOther(statement, mark))
  const rivets = rivetsOf(scene)
  return values.filter((value, index) => !isUnderOther(statement, value, 'head') && isOfHead(statement, value, values[index - 1])).flatMap((value, index) => {
    const side = sideOf(statement, value, index)
    if (value.what === 'diameters') return [judgedHead(scene, value, side, 1, [value])]
    const subject = nearestSubject(statement, value, rivets)
    return subject ? [judgedHead(scene, value, side, subject.inches, spanOf(subject, value), subject.inches)] : []
  })
}

const isOther = (statement: Statement, mark: Mark): boolean => ['hole', 'sheet', 'grip', 'edge', 'drill', 'apart', 'tube', 'other', 'washer', 'nut', 'wire'].includes(nounOf(statement, mark)) || dimensionOf(statement, mark) === 'length' || /\b(?:grip|shank|edge|stick|sticking|protrud\w*|beyond|hole)\b[^,;]{0,20}$/.test(before(statement, mark)) || /^\W*(?:of )?(?:shank|grip|from|sticking|beyond|edge|protru)/.test(behind(statement, mark))

/** Said to be wide or high, or put straight behind the head: "shop head 3/16 by 1/16". */
function isOfHead(statement: Statement, value: Mark, previous: Mark | undefined): boolean {
  if (dimensionOf(statement, value) !== '' || /\b(?:tails?|heads?)(?: [a-z]+){0,3}[:=,]? ?$|\b(?:spread|flatten|squeeze|buck|form)\b[^,;]{0,25}\b(?:to|at) (?:about )?$/.test(before(statement, value))) return true
  if (/\b(?:tails?|(?:shop|driven|bucked|formed)[ -]?heads?)\b/.test(behind(statement, value).slice(0, 30)) && value.what === 'diameters') return true
  return previous !== undefined && /^ ?(?:wide |high |tall )?(?:by|x|×|and) $/.test(between(statement, previous, value))
}

function sideOf(statement: Statement, mark: Mark, index: number): 'width' | 'height' {
  const side = dimensionOf(statement, mark)
  return side === 'width' || side === 'height' ? side : index === 0 ? 'width' : 'height'
}

function judgedHead({ statement, limits }: Scene, value: Mark, side: 'width' | 'height', diameter: number, marks: readonly Mark[], size?: number): Finding {
  const head = shopHead(diameter, /\b7050\b/.test(statement.text) ? '7050' : 'AD')
  const [drawn, least] = side === 'width' ? [head.width, head.leastWidth] : [head.height, head.leastHeight]
  const words = (amount: number): string => (size === undefined ? `${Number(amount.toFixed(2))} D` : `${decimalInches(amount)} in`)
  const expected = `${words(drawn)} ${side === 'width' ? 'wide' : 'high'}, at least ${words(least)}`
  const allowed: Allowed[] = [{ low: least, high: drawn, expected, citation: cite('shop-head', 'worked') }]
  const slack = size === undefined ? 0.01 : Math.max(0.002, value.step / 2, size * 0.04)
  const most = side === 'width' ? 1.7 * diameter : 0.66 * diameter
  return judge({ marks, low: value.low, high: value.high, slack, table: 'rivet', result: `head-${side}`, ...(size === undefined ? {} : { size }) }, allowed, limits, value.low >= least - slack && value.high <= most)
}

/** A rivet's length for the sheets it goes through, and the rule for it. */
export const lengthForGrip: Kind = (scene) => {
  const { statement, subjects } = scene
  if (headWords.test(statement.text)) return []
  const rule = ruleOfLength(statement)
  if (rule) return [rule]
  const rivets = rivetsOf(scene)
  const grips = gripOf(statement, subjects)
  const [first] = rivets
  if (!first || grips.length === 0) return []
  return lengthsOf(statement, subjects, rivets, grips).map(({ subject, mark, inches }) => judgedLength(scene, subject, mark, inches, grips))
}

/** "Grip plus 1.5 D", "1.5 D should stick out". */
function ruleOfLength(statement: Statement): Finding | undefined {
  const mark = claims(statement).find(({ what }) => what === 'diameters')
  if (!mark || !hasAny(statement, 'length', 'long', 'shank', 'stick', 'sticks', 'sticking', 'protrude', 'protrudes', 'protruding', 'protrusion', 'beyond', 'grip', 'past', 'stand', 'stands')
    || hasAny(statement, 'edge', 'pitch', 'apart', 'spacing', 'bolt', 'bolts', 'nut') || !/\b(?:rivets?|grip|shank)\b/.test(statement.text)) return undefined
  const allowed: Allowed[] = [{ low: rivets.length.allowanceD, high: rivets.length.allowanceD, expected: 'grip + 1.5 D', citation: cite('rivet-length') }]
  return judge({ marks: [mark], low: mark.low, high: mark.high, slack: 0.01, table: 'rivet', result: 'length-rule' }, allowed, [], mark.low >= 1.3 && mark.high <= 1.75)
}

const gripBefore = /\b(?:grip|stack|total|thickness|through|combined|sheets?|skins?|plus|and|of|pack|material)(?: (?:is|of|at|a|an|the|thickness|length|total|about|two|three|:|=))*[:=]? ?(?:a |an |the )?$/
const countWords: Record<string, number> = { two: 2, three: 3, four: 4, both: 2, double: 2, '2': 2, '3': 3 }

/** The sheets a rivet goes through: their marks and what they come to. */
function gripOf(statement: Statement, subjects: readonly Subject[]): { mark: Mark; inches: number }[] {
  const taken = new Set(subjects.flatMap(({ mark }) => (mark ? [mark] : [])))
  const plain = statement.marks.filter((mark) => mark.what === 'length' && !taken.has(mark) && dimensionOf(statement, mark) !== 'length' && !/\b(?:edge|apart|hole|from)\b/.test(statement.text))
  const named = plain.filter((mark) => nounOf(statement, mark) === 'grip' || leadOf(statement, mark) === 'grip' || /\b(?:grip|stack|total)(?: of| is| at|:)? ?(?:a |an |about )?$/.test(before(statement, mark)))
  if (named.length > 0) return named.slice(0, 1).map((mark) => ({ mark, inches: mark.low }))
  return plain.filter((mark) => mark.low < 0.3 && (nounOf(statement, mark) === 'sheet' || gripBefore.test(before(statement, mark)) || /^\W*(?:sheet|to|on|plus|\+|and) ?\.\d/.test(behind(statement, mark)))).map((mark) => {
    const times = countWords[/\b(two|three|four|both|double|2|3)(?: layers| sheets| thicknesses| pieces)?(?: of)?(?: the)? $/.exec(before(statement, mark))?.[1] ?? ''] ?? 1
    return { mark, inches: mark.low * times }
  })
}

function lengthsOf(statement: Statement, subjects: readonly Subject[], rivets: readonly Subject[], grips: readonly { mark: Mark }[]): { subject: Subject; mark: Mark; inches: number }[] {
  const designated = rivets.flatMap((subject) => (subject.mark && subject.length !== undefined && subject.mark.standing === 'claim' ? [{ subject, mark: subject.mark, inches: subject.length }] : []))
  if (designated.length > 0) return designated
  const [subject] = rivets
  const taken = new Set([...subjects.map(({ mark }) => mark), ...grips.map(({ mark }) => mark)])
  const long = claims(statement).filter((mark) => mark.what === 'length' && !taken.has(mark) && (dimensionOf(statement, mark) === 'length' || (nounOf(statement, mark) === 'rivet' && mark.low >= 0.18)))
  return subject ? long.map((mark) => ({ subject, mark, inches: mark.low })) : []
}

const shortest = -1 / 32
const longest = 1 / 16

function judgedLength({ limits }: Scene, subject: Subject, mark: Mark, inches: number, grips: readonly { mark: Mark; inches: number }[]): Finding {
  const grip = grips.reduce((sum, part) => sum + part.inches, 0)
  const needed = rivetLength(grip, subject.inches)
  const marks = [...spanOf(subject, mark), ...grips.map((part) => part.mark)]
  if (!(grip > 0.01 && grip < 3)) return finding(marks, 'cannot-tell', 'rivet')
  const words = `${decimalInches(needed)} in (grip + 1.5 D): ${lengthWords(nearestStockLength(needed)).display.inch}${nextStockLength(needed) === nearestStockLength(needed) ? '' : ` or ${lengthWords(nextStockLength(needed)).display.inch}`}`
  const allowed: Allowed[] = [{ low: needed + shortest, high: needed + longest, expected: words, citation: grips.length > 0 ? cite('rivet-length', 'worked') : COMMON_PRACTICE }]
  return judge({ marks, low: inches, high: inches, slack: 0.002, table: 'rivet', result: 'length', size: subject.inches }, allowed, limits, inches >= needed - 1 / 20 && inches <= needed + 3 / 32)
}
