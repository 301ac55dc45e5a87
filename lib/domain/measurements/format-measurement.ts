// How a measurement stands on a page: "3/16 in", also "0.1875 in · 4.76 mm"; the member's system first. A drill's number never stands without
// its decimal. Arrows and markup are the component's.
import type { Measurement, UnitName } from './measurement'
import { units, type LinearUnit } from './units'

export type FirstSystem = 'inch' | 'metric'

/** `text` stands by itself; `also` says the same otherwise, parts joined by " · ", or is ''. */
export interface ShownMeasurement { text: string; also: string }

export function formatMeasurement(measurement: Measurement, first: FirstSystem): ShownMeasurement {
  switch (measurement.kind) {
    case 'length': return arrange(inchForms(measurement), [metricLength(measurement)], first)
    case 'drill': return arrange([`${drillName(measurement)} · ${shopDecimal(measurement.value)}`], [metricLength(measurement)], first)
    case 'torque': return arrange([inUnit(measurement, 'in-lb', 'inch')], [inUnit(measurement, 'N·m', 'metric')], first)
    case 'pressure': return arrange([inUnit(measurement, 'psi', 'inch')], [inUnit(measurement, 'bar', 'metric')], first)
    case 'temperature': return arrange([inUnit(measurement, '°F', 'inch')], [inUnit(measurement, '°C', 'metric')], first)
    case 'angle': return { text: span(measurement.value, measurement.max, plainNumber, '°', ''), also: '' }
    case 'gauge': return { text: `${gaugeName(measurement)} AWG`, also: sizeOf(measurement, first) }
    case 'thread': return { text: measurement.exact ?? '', also: sizeOf(measurement, first) }
    case 'rivet': case 'bolt': return { text: measurement.exact ?? '', also: dimensionsOf(measurement, first) }
  }
}

function arrange(inch: string[], metric: string[], first: FirstSystem): ShownMeasurement {
  const [text = '', ...also] = first === 'inch' ? [...inch, ...metric] : [...metric, ...inch]
  return { text, also: also.join(' · ') }
}

/** A letter drill is named as such, or it would be read as anything. */
const drillName = ({ exact = '' }: Measurement): string => (exact.startsWith('#') ? exact : `letter ${exact}`)

const gaugeName = ({ value, max, exact }: Measurement): string => (exact ?? String(value)) + (max === undefined ? '' : `–${max}`)

/** The fraction as written and its decimal; feet stay feet. */
function inchForms({ unit, exact, value, max, inches, si }: Measurement): string[] {
  if (unit === 'ft' || unit === 'yd') return [exact ? `${exact} ${unit}` : span(value, max, plainNumber, unit)]
  if (unit !== 'in' || !exact) return [span(inches ?? 0, si.max === undefined ? undefined : si.max / 0.0254, unit === 'in' ? writtenInch : convertedInch, 'in')]
  const written = /['"]/.test(exact) ? exact : `${exact} in`
  return [written, span(value, max, inchDecimal, 'in')]
}

function metricLength({ unit, value, max, si, exact }: Measurement): string {
  if (unit === 'mm' || unit === 'cm' || unit === 'm' || unit === 'µm') return exact ? `${exact} ${unit}` : span(value, max, plainNumber, unit)
  const long = (si.max ?? si.value) >= 1
  const factor = long ? 1 : 1000
  return span(si.value * factor, si.max === undefined ? undefined : si.max * factor, millimetres, long ? 'm' : 'mm')
}

/** In its own unit as written, if that belongs to the system; else in the system's usual one. */
function inUnit({ unit, value, max, si, exact }: Measurement, usual: LinearUnit, system: FirstSystem): string {
  if (unit !== 'AWG' && units[unit].system === system) return exact ? `${exact} ${unit}` : span(value, max, plainNumber, unit)
  return span(fromSi(si.value, usual), si.max === undefined ? undefined : fromSi(si.max, usual), rounded, usual)
}

/** For showing only: doubles are good for what is rounded to two places. */
function fromSi(si: number, unit: LinearUnit): number {
  const { factor, zero } = units[unit]
  const scaled = si * (Number(factor.d) / Number(factor.n))
  return zero ? scaled - Number(zero.n) / Number(zero.d) : scaled
}

function sizeOf({ inches = 0, si }: Measurement, first: FirstSystem): string {
  const inch = si.max === undefined ? `${shopDecimal(inches)} in` : span(inches, si.max / 0.0254, shopDecimal, 'in')
  const metric = span(si.value * 1000, si.max === undefined ? undefined : si.max * 1000, millimetres, 'mm')
  return (first === 'inch' ? [inch, metric] : [metric, inch]).join(' · ')
}

/** 1/8 × 3/8 in · 3.18 × 9.53 mm; 3/16 in, grip 1/4 in · 4.76 mm, grip 6.35 mm. */
function dimensionsOf({ diameter = 0, length, grip }: Measurement, first: FirstSystem): string {
  const said = (show: (inches: number) => string, unit: string): string =>
    grip !== undefined ? `${show(diameter)} ${unit}, grip ${show(grip)} ${unit}` : `${show(diameter)}${length === undefined ? '' : ` × ${show(length)}`} ${unit}`
  const inch = said(shopFraction, 'in')
  const metric = said((inches) => millimetres(inches * 25.4), 'mm')
  return (first === 'inch' ? [inch, metric] : [metric, inch]).join(' · ')
}

function span(low: number, high: number | undefined, show: (value: number) => string, unit: UnitName | '', gap = ' '): string {
  // A dash in front of a minus would be read as one.
  const joined = high === undefined ? show(low) : high < 0 || low < 0 ? `${show(low)} to ${show(high)}` : `${show(low)}–${show(high)}`
  return joined + (unit === '' ? '' : (unit.startsWith('°') && unit.length === 1 ? '' : gap) + unit)
}

/** Without an exponent, as written. */
const plainNumber = (value: number): string => decimal(value, 7)
const writtenInch = (value: number): string => decimal(value, 7, value < 0.1 ? 3 : 0)
const inchDecimal = (value: number): string => decimal(value, 4, value < 0.1 ? 3 : 0)
const convertedInch = (value: number): string => decimal(value, value < 10 ? 4 : 2, value < 0.1 ? 3 : 0)
const rounded = (value: number): string => decimal(value, Math.abs(value) < 10 ? 2 : 1)
/** Drills and wire: three places at least, as their tables print them. */
const shopDecimal = (value: number): string => decimal(value, 4, 3)
const millimetres = (value: number): string => decimal(value, Math.abs(value) < 1 ? 3 : 2)

/** Halves go up, as 3.175 goes to 3.18; zeros at the end go, down to a number of places. */
function decimal(value: number, places: number, least = 0): string {
  const size = 10 ** places
  const text = (Math.round(Math.abs(value) * size + 1e-6) / size * Math.sign(value)).toFixed(places)
  const dot = text.indexOf('.')
  if (dot < 0) return text
  let end = text.length
  while (end > dot + 1 + least && text.charAt(end - 1) === '0') end -= 1
  return text.slice(0, end === dot + 1 ? dot : end)
}

/** In 64ths if it is some, else a decimal. */
function shopFraction(inches: number): string {
  const parts = inches * 64
  if (!Number.isInteger(parts) || parts === 0) return shopDecimal(inches)
  let [n, d] = [parts % 64, 64]
  while (n % 2 === 0 && n > 0) [n, d] = [n / 2, d / 2]
  const whole = Math.floor(parts / 64)
  return n === 0 ? String(whole) : `${whole > 0 ? `${whole} ` : ''}${n}/${d}`
}
