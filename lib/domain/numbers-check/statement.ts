// A sentence as the kinds see it: words and marks in a row, and the questions they ask of a mark's neighbours.
import type { Mark } from './marks'
import type { ClaimRole } from './numbers-check'
import { boundOf } from './stance'

export interface Word { type: 'word'; text: string; start: number; end: number }
export type Item = Mark | Word

export interface Statement {
  /** The sentence in lower case with plain apostrophes; `offset` is its place in the whole text. */
  text: string
  offset: number
  role: ClaimRole
  items: readonly Item[]
  marks: readonly Mark[]
  words: ReadonlySet<string>
}

/** Between the marks, words and single signs. */
export function statementOf(raw: string, offset: number, role: ClaimRole, marks: readonly Mark[]): Statement {
  const lower = raw.toLowerCase()
  // A few letters grow in lower case (İ): then only the Latin ones are changed, or places would shift.
  const text = (lower.length === raw.length ? lower : raw.replace(/[A-Z]/g, (letter) => letter.toLowerCase())).replaceAll('’', "'")
  const items: Item[] = []
  let from = 0
  const wordsTo = (end: number): void => {
    for (const match of text.slice(from, end).matchAll(/[\p{L}]+(?:'[\p{L}]+)?|\d[\d./]*|[^\s\p{L}\d]/gu)) {
      const start = offset + from + match.index
      items.push({ type: 'word', text: match[0], start, end: start + match[0].length })
    }
  }
  for (const mark of marks) {
    wordsTo(mark.start - offset)
    items.push(mark)
    from = mark.end - offset
  }
  wordsTo(text.length)
  return { text, offset, role, items, marks, words: new Set(items.flatMap((item) => (item.type === 'word' ? [item.text] : []))) }
}

export const placeOf = (statement: Statement, mark: Mark): number => statement.items.indexOf(mark)

/** The word at a place, or '' where there is a mark or nothing. */
export function wordAt(statement: Statement, place: number): string {
  const item = statement.items[place]
  return item?.type === 'word' ? item.text : ''
}

/** As far as the kinds look on either side of a mark: a bound on their work. */
const sight = 80
export const before = ({ text, offset }: Statement, mark: Mark): string => text.slice(Math.max(0, mark.start - offset - sight), mark.start - offset)
export const behind = ({ text, offset }: Statement, mark: Mark): string => text.slice(mark.end - offset, mark.end - offset + sight)
export const between = (statement: Statement, a: Mark, b: Mark): string => statement.text.slice(a.end - statement.offset, b.start - statement.offset)

export const hasAny = (statement: Statement, ...words: string[]): boolean => words.some((word) => statement.words.has(word))
export const claims = (statement: Statement): Mark[] => statement.marks.filter(({ standing }) => standing === 'claim')

const adjectives = new Set(`diameter dia diam solid flush universal blind pull pulled pop ad dd hard soft head headed countersunk protruding driven shop bucked formed long short stainless steel aluminium aluminum alloy alclad
  inch inches in. thick size sized nominal pilot final od id o.d. i.d. bore inside outside nom clean round-head round countersink csk machine structural oops close-tolerance - od/id full plain new old row main
  upper lower top bottom rear front left right spar rib skin shank grip twist number letter fractional rubber split nylon bare clad hydraulic brake fuel soft-aluminum 100 degree oversize reamed clearance panel hollow cherry bend`.split(/\s+/))
const nouns: Record<string, string> = {
  rivet: 'rivet', tail: 'rivet', shophead: 'rivet', bolt: 'bolt', screw: 'screw', hole: 'hole', drill: 'drill', bit: 'drill', reamer: 'drill', cleco: 'drill', clecoe: 'drill', drillbit: 'drill', sheet: 'sheet', skin: 'sheet', web: 'sheet',
  plate: 'sheet', aluminum: 'sheet', aluminium: 'sheet', alclad: 'sheet', material: 'sheet', stock: 'sheet', metal: 'sheet', flange: 'sheet', rib: 'sheet', doubler: 'sheet', angle: 'sheet',
  tube: 'tube', tubing: 'tube', line: 'tube', pipe: 'tube', conduit: 'tube', hose: 'hose', grommet: 'grommet', radius: 'radius', radii: 'radius', grip: 'grip', stack: 'grip', total: 'grip', edge: 'edge', edges: 'edge',
  centre: 'centre', center: 'centre', apart: 'apart', head: 'head', pitch: 'apart', spacing: 'apart', wire: 'wire', bundle: 'wire', nut: 'nut', groove: 'groove', thread: 'thread', washer: 'washer', wall: 'wall', block: 'block', gap: 'other', shim: 'other', wrench: 'other', spanner: 'other', socket: 'other', cup: 'other', slot: 'other', overlap: 'other', burr: 'other', lip: 'other', joggle: 'other', step: 'other', spacer: 'other', bushing: 'other', pin: 'other', punch: 'other', strip: 'other',
}

const singular = (word: string): string => (nouns[word] ? word : word.replace(/s$/, ''))

/** What a mark is put in front of: "1/8 solid rivets" is a rivet. '' where it stands alone. */
export function nounOf(statement: Statement, mark: Mark): string {
  const at = placeOf(statement, mark)
  let last = ''
  for (let place = at + 1; place <= at + 6; place += 1) {
    const word = wordAt(statement, place)
    const noun = nouns[singular(word)]
    if (noun && !['sheet', 'head', 'grip'].includes(noun)) return noun
    if (noun) last = noun
    else if (!adjectives.has(word) && !isNameOf(statement, place)) break
  }
  return last
}

const functionWords = new Set('in for of and to with at on from by per the a an is are or between through under over each than as take takes need needs want wants if when where edge wide tall high deep apart then use'.split(' '))
/** "nutplate rivets", "spar bolts": any one word in front of the thing itself. */
const isNameOf = (statement: Statement, place: number): boolean => /^[\p{L}]{3,}$/u.test(wordAt(statement, place)) && !functionWords.has(wordAt(statement, place)) && ['rivet', 'bolt', 'screw'].includes(nouns[singular(wordAt(statement, place + 1))] ?? '')

const leads = new Set(['of', 'is', 'are', 'to', 'at', 'with', 'a', 'an', 'the', ':', '=', '(', 'about', 'be', 'should', 'must', 'size', 'diameter', 'dia', 'than', 'least', 'only', 'by', 'under', 'over', 'minimum', 'min', 'max', 'exactly', 'good', 'full', 'in', 'has', 'have', 'having', 'needs', 'need', 'gets', 'wants', 'takes', 'want', 'take', 'for'])

/** What stands in front of a mark: "hole of 0.128", "grip is 1/4". '' where it isn't near. */
export function leadOf(statement: Statement, mark: Mark): string {
  const at = placeOf(statement, mark)
  for (let place = at - 1; place >= at - 5; place -= 1) {
    const word = wordAt(statement, place)
    const noun = nouns[singular(word)]
    if (noun) return noun
    if (!leads.has(word)) return ''
  }
  return ''
}

const dimensions: Record<string, string> = {
  wide: 'width', width: 'width', across: 'width', diameter: 'width', dia: 'width', tall: 'height', high: 'height', height: 'height', thick: 'height', thickness: 'height', proud: 'height', deep: 'depth', depth: 'depth', long: 'length', length: 'length',
}

/** "0.188 wide", "width 0.188", "height of 1/16". */
export function dimensionOf(statement: Statement, mark: Mark): string {
  const at = placeOf(statement, mark)
  const after = wordAt(statement, at + 1)
  const next = dimensions[after] ?? (after === 'in' ? dimensions[wordAt(statement, at + 2)] : undefined)
  if (next) return next
  for (let place = at - 1; place >= at - 3; place -= 1) {
    const word = wordAt(statement, place)
    if (dimensions[word]) return wordAt(statement, place - 1) === '' && statement.items[place - 1]?.type === 'mark' ? '' : dimensions[word]
    if (!leads.has(word)) return ''
  }
  return ''
}

/** Whether a mark is given as a least or a most. */
export const boundAt = (statement: Statement, mark: Mark): 'least' | 'most' | undefined => boundOf(before(statement, mark), behind(statement, mark))

const labels: Record<string, RegExp> = {
  edge: /\bedges?\b|\be\.d\./, apart: /\b(?:pitch|spacing|spaced|apart|cent(?:er|re)s|closer)\b/, head: /\b(?:tails?|(?:shop|driven|bucked|upset|formed)[ -]?heads?|wide|tall|high)\b/,
  hole: /\b(?:holes?|drills?|bits?|ream)\b/, grip: /\b(?:grip|stack|long)\b/,
}

/** Whether the words between the commas round a mark speak of something else than `label`: "hole #30, edge 1/4, pitch 1 in". */
export function isUnderOther(statement: Statement, mark: Mark, label: 'edge' | 'apart' | 'head' | 'hole' | 'grip'): boolean {
  const [front, back] = [before(statement, mark), behind(statement, mark)]
  const clause = `${front.slice(Math.max(front.lastIndexOf(','), front.lastIndexOf(';'), front.lastIndexOf(':')) + 1)} ${/^[^,;]*/.exec(back)?.[0] ?? ''}`
  return labels[label]?.test(clause) !== true && Object.values(labels).some((other) => other.test(clause))
}
