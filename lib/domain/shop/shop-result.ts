// Makes results of values: the number, how it reads in inch and in metric, and whose it is.
import type { Citation } from './citation'
import { fractionOfInch } from './exact-fraction'
import type { Drill } from './drill-series'
import type { ShopResult, ShopValue } from './shop-table'

const MM_PER_INCH = 25.4
const NM_PER_LBF_IN = 0.1129848290276167

export interface Quantity {
  value: ShopValue
  unit: string
  display: { inch: string; metric: string }
}

interface Extra {
  note?: string | false | undefined
  how?: string
  /** In what the reader's own measure doesn't meet this result; said in the note too. */
  against?: string | false | undefined
}

/** One result. Notes of the source come first. */
export function result(name: string, quantity: Quantity, { source, basis, notes }: Citation, extra: Extra = {}): ShopResult {
  const note = [...notes, ...(extra.note ? [extra.note] : [])].join('; ')
  return { name, ...quantity, source, basis, ...(note ? { note } : {}), ...(extra.how ? { how: extra.how } : {}), ...(extra.against ? { against: extra.against } : {}) }
}

/** Half a unit of the last place rounds away from zero: 3.175 is 3.18, whatever the binary digits behind it. */
export const rounded = (value: number, places: number): string => (value + Math.sign(value) * 1e-9).toFixed(places)
/** "0.253": three decimals, as lengths are spoken of in a shop. */
export const decimalInches = (inches: number, places = 3): string => rounded(inches, places)
export const millimetres = (inches: number): string => rounded(inches * MM_PER_INCH, 2)

const inchWords = (inches: number): string => fractionOfInch(inches) ?? decimalInches(inches)

/** A length in inches; its fraction is the label when it has one. */
export function length(inches: number): Quantity {
  const label = fractionOfInch(inches)
  return { value: { number: inches, ...(label ? { label } : {}) }, unit: 'in', display: { inch: `${inchWords(inches)} in`, metric: `${millimetres(inches)} mm` } }
}

/** Thousandths for a sheet or a gap, ten-thousandths for a drill; never a fraction. */
export function thickness(inches: number, places = 3): Quantity {
  return { value: { number: inches }, unit: 'in', display: { inch: `${decimalInches(inches, places)} in`, metric: `${millimetres(inches)} mm` } }
}

export function lengthRange(min: number, max: number): Quantity {
  return { value: { min, max }, unit: 'in', display: { inch: `${inchWords(min)} to ${inchWords(max)} in`, metric: `${millimetres(min)} to ${millimetres(max)} mm` } }
}

/** A least length: no upper end. */
export function atLeast(inches: number): Quantity {
  return { value: { min: inches }, unit: 'in', display: { inch: `at least ${inchWords(inches)} in`, metric: `at least ${millimetres(inches)} mm` } }
}

/** A drill with its decimal: the name never stands alone. `names` are all drills of that diameter. */
export function drillSize(drill: Drill, names: string = drill.name): Quantity {
  return { value: { number: drill.inches, label: names }, unit: 'in', display: { inch: `${names} · ${decimalInches(drill.inches, 4)} in`, metric: `${millimetres(drill.inches)} mm` } }
}

/** Inch-pounds, a value or a range. */
export function torque(min: number, max?: number): Quantity {
  const span = (scale: number, places: (value: number) => number): string => {
    const [low, high] = [min * scale, (max ?? min) * scale].map((value) => rounded(value, places(value)))
    return low === high ? String(low) : `${low} to ${high}`
  }
  return {
    value: max === undefined ? { number: min } : { min, max }, unit: 'lbf-in',
    display: { inch: `${span(1, (value) => (Number.isInteger(value) ? 0 : 1))} in-lb`, metric: `${span(NM_PER_LBF_IN, (value) => (value < 10 ? 2 : 1))} N·m` },
  }
}

/** A plain number with its unit, the same in both systems. */
export function amount(number: number, unit: string, places = 4): Quantity {
  const shown = `${Number(number.toFixed(places))}${unit ? ` ${unit}` : ''}`
  return { value: { number }, unit, display: { inch: shown, metric: shown } }
}

export function amountRange(min: number, max: number, unit: string): Quantity {
  const shown = `${min} to ${max} ${unit}`.trim()
  return { value: { min, max }, unit, display: { inch: shown, metric: shown } }
}

/** An answer in words. */
export function words(label: string): Quantity {
  return { value: { label }, unit: '', display: { inch: label, metric: label } }
}

/** The table has no value: nothing is put in its place. */
export function noValue(unit: string): Quantity {
  return { value: {}, unit, display: { inch: 'no value', metric: 'no value' } }
}
