// The numbers and names of a sentence that the kinds compare: measurements, and what only this check reads (screws, 2 D, alloys, nuts, grommets).
import { drillNamed } from '../measurements/drill-sizes'
import type { Measurement } from '../measurements/measurement'
import { kindOfUnit } from '../shop/unit-conversion'

export type MarkKind =
  | 'length' | 'drill' | 'torque' | 'pressure' | 'angle' | 'temperature' | 'rivet' | 'bolt' | 'thread' | 'gauge'
  | 'screw' | 'diameters' | 'thicknesses' | 'grommet' | 'alloy' | 'head' | 'nut' | 'tube' | 'amount' | 'amps' | 'threads'

export interface Mark {
  type: 'mark'
  what: MarkKind
  /** In the whole text. */
  start: number
  end: number
  raw: string
  /** Inches for sizes, inch-pounds for torque, times for diameters and thicknesses, its own unit for the rest. */
  low: number
  high: number
  /** One unit of the last place that was written, in the unit of `low`; 0 when it is exact. */
  step: number
  unit: string
  /** What a name stands for: "2024-T3", "shear", "AN3". */
  name: string
  /** Of a rivet or bolt designation, inches. */
  length?: number
  /** A measurement of what quantity: what may be equated. */
  dimension: string
  /** subject: known, but nothing is claimed of it. */
  standing: 'claim' | 'subject'
}

export const NEWTON_METRES_PER_INCH_POUND = 0.1129848290276167
const METRES_PER_INCH = 0.0254

/** A measurement as a mark. */
export function markOf(measurement: Measurement): Mark {
  const { kind, si, raw, start, end, unit, value, max, exact = '', length } = measurement
  const scale = scaleOf(measurement)
  const low = kind === 'gauge' || kind === 'temperature' || kind === 'angle' ? value : si.value / scale
  const high = max === undefined ? low : si.max === undefined || kind === 'gauge' || kind === 'temperature' || kind === 'angle' ? max : si.max / scale
  return {
    type: 'mark', what: kind, start, end, raw, low, high, step: stepOf(measurement, low), unit, name: exact,
    ...(length === undefined ? {} : { length }), dimension: kind === 'drill' ? 'length' : kind, standing: 'claim',
  }
}

const scaleOf = ({ kind }: Measurement): number => (kind === 'torque' ? NEWTON_METRES_PER_INCH_POUND : kind === 'pressure' ? 1 : METRES_PER_INCH)

function stepOf({ kind, raw, value }: Measurement, low: number): number {
  if (kind === 'drill' || kind === 'rivet' || kind === 'bolt' || kind === 'thread' || /[/½¼¾⅛⅜⅝⅞]/.test(raw) || !/\d/.test(raw)) return 0
  const places = /[.,](\d+)/.exec(raw)?.[1]?.length ?? 0
  return kind === 'temperature' || value === 0 ? 10 ** -places : (10 ** -places * low) / value
}

/** `needs`: what a sentence must hold at all, cheap to look for. `yields`: to a measurement in the same place. */
interface Reader { needs: RegExp; pattern: RegExp; read: (match: RegExpExecArray) => Partial<Mark> & { what: MarkKind } | undefined; yields?: true }

const counts: Record<string, number> = { half: 0.5, one: 1, 'one and a half': 1.5, two: 2, twice: 2, 'two and a half': 2.5, three: 3, four: 4, five: 5, six: 6, eight: 8, ten: 10 }
const count = '(?:\\d{1,2}[- ]1\\/2|\\d{0,2}½|\\d{1,2}(?:\\.\\d{1,3})?|\\.\\d{1,3}|half|one and a half|two and a half|one|two|twice|three|four|five|six|eight|ten)'

function countOf(text: string): number {
  const word = counts[text.toLowerCase()]
  if (word !== undefined) return word
  const half = /^(\d{0,2})[- ]?(?:½|1\/2)$/.exec(text)
  return half ? Number(half[1] ?? 0) + 0.5 : Number(text)
}

const multiple = (what: 'diameters' | 'thicknesses') => (match: RegExpExecArray) => {
  const low = countOf(match[1] ?? '')
  return { what, low, high: match[2] ? countOf(match[2]) : low, unit: what === 'diameters' ? 'D' : 't' }
}

const nutKinds: Record<string, string> = {
  AN310: 'tension', AN315: 'tension', AN365: 'tension', MS20365: 'tension', AN320: 'shear', AN316: 'shear', AN364: 'shear', MS20364: 'shear', MS21083: 'shear',
}
const amountUnits: Record<string, string> = {
  lb: 'lb', lbs: 'lb', pound: 'lb', pounds: 'lb', kg: 'kg', kilo: 'kg', kilos: 'kg', kilogram: 'kg', kilograms: 'kg', g: 'g', gram: 'g', grams: 'g', oz: 'oz', ounce: 'oz', ounces: 'oz',
  gal: 'US gal', gallon: 'US gal', gallons: 'US gal', qt: 'US qt', quart: 'US qt', quarts: 'US qt', l: 'L', litre: 'L', litres: 'L', liter: 'L', liters: 'L', ml: 'mL',
  kt: 'kt', kts: 'kt', knot: 'kt', knots: 'kt', mph: 'mph', 'km/h': 'km/h', kph: 'km/h', 'm/s': 'm/s',
}
const screwWords = '(?:flush|pan|flat|oval|truss|round|button|socket|cap|head|headed|machine|wood|sheet|metal|structural|steel|stainless|brass|nylon|countersunk|small|trim|self-tapping|six-lobe|phillips)'

const readers: readonly Reader[] = [
  // Whole diameters need the plural or a capital D: ".188 diameter" is a length.
  { needs: /\dd\b| d\b|½d\b|diameters/i, pattern: new RegExp(`(?<![\\w/.#-])(${count})(?: ?(?:-|–|to) ?(${count}))? ?(?:[x×] ?|times )?(?:(?:a |the |its |of the )?(?:rivet |shank |bolt |hole )?diameters\\b|(?:a )?D\\b(?! ?(?:drill|bit)))`, 'giu'), read: multiple('diameters') },
  { needs: /diameter|dia\b/i, pattern: new RegExp(`(?<![\\w/.#-])(${count})(?: (?:-|–|to) (${count}))? ?(?:(?:[x×]|times) (?:the |its |a )?|(?<=half |twice )(?:the |its |a ))(?:rivet |shank |bolt |rivet's )?(?:diameter|dia)\\b`, 'giu'), read: multiple('diameters') },
  { needs: /one (?:\w+ )?diameter/i, pattern: /\bone (?:rivet |shank |hole |bolt )?diameter(?= (?:from|off|away|to|between|apart|is)\b)/giu, read: () => ({ what: 'diameters', low: 1, high: 1, unit: 'D' }) },
  { needs: /\dt\b| t\b|thickness/i, pattern: new RegExp(`(?<![\\w/.#-])(${count})(?: ?(?:-|–|to) ?(${count}))? ?(?:t\\b|(?:[x×] ?|times )(?:the |its )?(?:sheet |metal |material |skin )?(?:thickness|t\\b)|thicknesses\\b)`, 'giu'), read: multiple('thicknesses') },
  { needs: /screw|nutplate/i, pattern: new RegExp(`(?:#|\\bno\\.? ?|\\bnumber )(\\d{1,2})(?= (?:${screwWords} ){0,3}(?:screws?|nutplates?)\\b)`, 'giu'), read: (match) => ({ what: 'screw', name: match[1] ?? '' }) },
  { needs: /931|35489/, pattern: /\bAN ?931-(\d{1,2})-(\d{1,2})\b|\bMS ?35489-(\d{1,3})\b/giu, read: (match) => ({ what: 'grommet', name: match[0].toUpperCase().replaceAll(' ', '') }) },
  { needs: /2024|6061|7075|5052/, pattern: /\b(2024|6061|7075|5052)[- ]?(T\d{1,3}|O|0|H3[2468])\b/gu, read: (match) => ({ what: 'alloy', name: `${match[1]}-${(match[2] ?? '').replace(/^0$/, 'O')}` }) },
  { needs: /31[056]|320|36[45]|21083/, pattern: /\b(AN|MS) ?(310|315|316|320|36[45]|2036[45]|21083)(?:-?[A-Z]{0,2}\d{0,4}[A-Z]?)?\b/gu, read: (match) => ({ what: 'nut', name: nutKinds[`${match[1]}${match[2]}`] ?? '' }) },
  { needs: /81[789]-/, pattern: /\bAN ?81[789]-(\d{1,2})D?\b/gu, read: (match) => ({ what: 'tube', low: Number(match[1]), name: 'nut' }) },
  { needs: /tub|line|hose|fitting|nut|flare/i, pattern: /(?<![\w-])(?:-|dash[ -]?)(\d{1,2})(?= (?:(?:flare|flared|aluminium|aluminum|steel|fuel|brake|oil|AN|B) )?(?:tubes?|tubing|lines?|hoses?|fittings?|nuts?|b-?nuts?|flares?)\b)/giu, read: (match) => ({ what: 'tube', low: Number(match[1]) }) },
  { needs: /rivet/i, pattern: /(?<![\w-])(?:-|dash[ -]?)(\d)(?= (?:(?:solid|flush|universal|AD|blind|pop|pull|round|countersunk) ){0,2}rivets?\b)/giu, read: (match) => ({ what: 'rivet', low: Number(match[1]) / 32, high: Number(match[1]) / 32 }), yields: true },
  { needs: /4[27][06]|1097/, pattern: /\b(?:AN ?(?:426|470)|MS ?20(?:426|470)|NAS ?1097)(?:AD)?\b/gu, read: (match) => ({ what: 'head', name: /470/.test(match[0]) ? 'universal' : 'flush' }), yields: true },
  { needs: /cent(?:er|re)/i, pattern: /(?<=\bon )(\d{1,2})\/(\d{1,2})(?= (?:inch )?cent(?:er|re)s?\b)/giu, read: (match) => ({ what: 'length', low: Number(match[1]) / Number(match[2]), high: Number(match[1]) / Number(match[2]), unit: 'in' }), yields: true },
  { needs: /letter|drill|size/i, pattern: /\b(?:letter|drill|size) ["“]?([A-Z])\b["”]?(?![-'’])/gu, read: (match) => drillMark(match[1] ?? ''), yields: true },
  { needs: /\d ?a/i, pattern: /(?<![\w./-])(\d{1,3}(?:\.\d)?) ?(?:A\b|amps?\b|amperes?\b)/gu, read: (match) => ({ what: 'amps', low: Number(match[1]), unit: 'A' }), yields: true },
  { needs: /thread/i, pattern: /(?<![\w./-])(\d(?:\.\d)?|no|one|two|three|four|five) (?:full |whole |complete )?threads?\b/giu, read: (match) => ({ what: 'threads', low: match[1]?.toLowerCase() === 'no' ? 0 : countOf(match[1] ?? '') }) },
  { needs: /\d ?[a-z]/i, pattern: /(?<![\w./#-])(\d{1,6}(?:\.\d{1,4})?) ?(km\/h|m\/s|[a-z]{1,9})\b(?![-·])/giu, read: amountMark, yields: true },
]

function drillMark(letter: string): Partial<Mark> & { what: MarkKind } | undefined {
  const drill = drillNamed(letter)
  return drill && { what: 'drill', low: drill.inches, high: drill.inches, name: letter, unit: 'in', dimension: 'length' }
}

function amountMark(match: RegExpExecArray): Partial<Mark> & { what: MarkKind } | undefined {
  const unit = amountUnits[match[2]?.toLowerCase() ?? '']
  const places = /\.(\d+)/.exec(match[1] ?? '')?.[1]?.length ?? 0
  return unit ? { what: 'amount', low: Number(match[1]), unit, step: 10 ** -places, dimension: kindOfUnit(unit) ?? '' } : undefined
}

/** All marks of a sentence that begins at `start` of the text, in order; what this file reads itself comes before a measurement that overlaps it, unless it yields. */
export function marksOf(slice: string, start: number, measurements: readonly Measurement[]): Mark[] {
  const measured = measurements.map(markOf)
  const [strong, weak]: [Mark[], Mark[]] = [[], []]
  for (const { needs, pattern, read, yields } of readers) {
    if (!needs.test(slice)) continue
    for (const match of slice.matchAll(pattern)) {
      const found = read(match)
      if (!found) continue
      const low = found.low ?? 0
      const from = start + match.index
      ;(yields ? weak : strong).push({ type: 'mark', start: from, end: from + match[0].length, raw: match[0], high: low, step: 0, unit: '', name: '', dimension: found.what, standing: 'claim', ...found, low })
    }
  }
  const kept: Mark[] = []
  for (const group of [strong, measured, weak]) {
    for (const mark of group) if (!kept.some((other) => mark.start < other.end && other.start < mark.end)) kept.push(mark)
  }
  return kept.sort((a, b) => a.start - b.start)
}
