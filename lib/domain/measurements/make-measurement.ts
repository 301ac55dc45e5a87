// A measurement from what was read: its values in its own unit, SI and inches, from one exact number.
import type { Measurement, MeasurementKind, UnitName } from './measurement'
import type { Passage } from './passage'
import { toInches, toSi, units, type LinearUnit, type Ratio } from './units'

/** What a reader found, and the place behind it. */
export interface Finding { measurements: Measurement[]; next: number }

/** A reader's "this is mine, and no measurement". */
export const nothing = (next: number): Finding => ({ measurements: [], next })

/** A quantity or range in one of the linear units, written from one lexeme to the one in front of `next`; `text` is its exact form when the decimal says less. */
export function quantity(passage: Passage, from: number, next: number, unit: LinearUnit, low: Ratio, text?: string, high?: Ratio): Measurement {
  const { kind, si } = units[unit]
  const measurement = start(passage, from, next, kind, low.n / low.d, unit)
  measurement.si = { value: toSi(low, unit), unit: si }
  if (text) measurement.exact = text
  if (si === 'm') measurement.inches = toInches(low, unit)
  if (high) {
    measurement.max = high.n / high.d
    measurement.si.max = toSi(high, unit)
  }
  return measurement
}

/** Something known by its nominal diameter in inches, as a name says it: a drill, thread, rivet or bolt. */
export function sized(passage: Passage, from: number, next: number, kind: MeasurementKind, diameter: Ratio, name: string): Measurement {
  const measurement = start(passage, from, next, kind, diameter.n / diameter.d, 'in')
  measurement.si = { value: toSi(diameter, 'in'), unit: 'm' }
  measurement.exact = name
  measurement.inches = measurement.value
  return measurement
}

function start(passage: Passage, from: number, next: number, kind: MeasurementKind, value: number, unit: UnitName): Measurement {
  const begin = passage.lexemes[from]?.start ?? 0
  const end = passage.lexemes[next - 1]?.end ?? begin
  return { raw: passage.text.slice(begin, end), start: begin, end, kind, value, unit, si: { value, unit: 'm' } }
}

/**
 * American wire gauge: 0.005 in × 92^((36 − n) / 39), to a tenth of a thousandth as ASTM B258 prints it. 1/0 is 0, 4/0 is −3. Inches.
 */
export function wireDiameter(gauge: number): number {
  return Math.round(0.005 * 92 ** ((36 - gauge) / 39) * 10_000) / 10_000
}

/** One wire gauge, or the thick and the thin end of a range: its number grows as its diameter shrinks. */
export function wireGauge(passage: Passage, from: number, next: number, gauge: number, other = gauge): Measurement {
  const low = Math.min(gauge, other)
  const high = Math.max(gauge, other)
  const measurement = start(passage, from, next, 'gauge', low, 'AWG')
  const metres = (number: number): number => toSi({ n: Math.round(wireDiameter(number) * 10_000), d: 10_000 }, 'in')
  measurement.si.value = metres(high)
  measurement.inches = wireDiameter(high)
  if (low < 1) measurement.exact = `${1 - low}/0`
  if (high > low) {
    measurement.max = high
    measurement.si.max = metres(low)
  }
  return measurement
}
