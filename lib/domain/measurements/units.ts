// Units and their exact factors to SI. Source: NIST Special Publication 811 (2008), appendix B.8 (factors in bold are exact) and B.9;
// lbf = 0.453 592 37 kg × 9.806 65 m/s², both exact. Words for units are read-unit.ts.
import { exact, exactDecimal, minus, over, plus, times, toNumber, type Exact } from './exact'
import type { MeasurementKind, SiUnit, UnitName } from './measurement'

export interface Unit {
  kind: MeasurementKind
  si: SiUnit
  /** The SI value of one. Angles leave out π, which no fraction is. */
  factor: Exact
  /** Added before the factor is applied: the temperature scales. */
  zero?: Exact
  system: 'inch' | 'metric' | 'both'
}

const inch = exactDecimal('0.0254')
const foot = exactDecimal('0.3048')
const poundForce = times(exactDecimal('0.45359237'), exactDecimal('9.80665'))
const poundPerSquareInch = over(poundForce, times(inch, inch))

const length = (factor: Exact, system: Unit['system']): Unit => ({ kind: 'length', si: 'm', factor, system })
const torque = (factor: Exact, system: Unit['system']): Unit => ({ kind: 'torque', si: 'N·m', factor, system })
const pressure = (factor: Exact, system: Unit['system']): Unit => ({ kind: 'pressure', si: 'Pa', factor, system })

/** Every unit but the wire gauge, which is no multiple of anything. */
export const units: Record<Exclude<UnitName, 'AWG'>, Unit> = {
  in: length(inch, 'inch'),
  ft: length(foot, 'inch'),
  yd: length(exactDecimal('0.9144'), 'inch'),
  thou: length(exactDecimal('0.0000254'), 'inch'),
  mm: length(exact(1, 1000), 'metric'),
  cm: length(exact(1, 100), 'metric'),
  m: length(exact(1), 'metric'),
  'µm': length(exact(1, 1_000_000), 'metric'),
  'in-lb': torque(times(poundForce, inch), 'inch'),
  'ft-lb': torque(times(poundForce, foot), 'inch'),
  'oz-in': torque(over(times(poundForce, inch), exact(16)), 'inch'),
  'N·m': torque(exact(1), 'metric'),
  psi: pressure(poundPerSquareInch, 'inch'),
  ksi: pressure(times(poundPerSquareInch, exact(1000)), 'inch'),
  // "Inch of mercury, conventional": the printed factor, which is not an exact one.
  inHg: pressure(exactDecimal('3386.389'), 'inch'),
  bar: pressure(exact(100_000), 'metric'),
  mbar: pressure(exact(100), 'metric'),
  hPa: pressure(exact(100), 'metric'),
  kPa: pressure(exact(1000), 'metric'),
  MPa: pressure(exact(1_000_000), 'metric'),
  '°': { kind: 'angle', si: 'rad', factor: exact(1, 180), system: 'both' },
  '°F': { kind: 'temperature', si: 'K', factor: exact(5, 9), zero: exactDecimal('459.67'), system: 'inch' },
  '°C': { kind: 'temperature', si: 'K', factor: exact(1), zero: exactDecimal('273.15'), system: 'metric' },
}

export type LinearUnit = keyof typeof units

/** The SI value, exact but for angles' factor π. */
export function toSiExact(value: Exact, unit: LinearUnit): Exact {
  const { factor, zero } = units[unit]
  return times(zero ? plus(value, zero) : value, factor)
}

/** A value as two whole numbers, n / d, d above zero: what a text can say. */
export interface Ratio { n: number; d: number }

/** The SI value as the nearest number: m, N·m, Pa, rad or K. */
export function toSi(value: Ratio, unit: LinearUnit): number {
  const si = short(value, unit) ?? toNumber(toSiExact(exact(value.n, value.d), unit))
  return units[unit].si === 'rad' ? si * Math.PI : si
}

/** A length as the nearest number of inches. */
export function toInches(value: Ratio, unit: LinearUnit): number {
  return unit === 'in' ? value.n / value.d : toNumber(convert(exact(value.n, value.d), unit, 'in'))
}

/** Factors small enough that a double holds every whole number on the way: then one division rounds once, and nothing else does. */
const shortFactors = new Map(
  Object.entries(units).flatMap(([name, { factor, zero }]) => {
    const [n, d] = [Number(factor.n), Number(factor.d)]
    return !zero && n < 1e6 && d < 1e8 ? [[name, { n, d }] as const] : []
  }),
)

function short({ n, d }: Ratio, unit: LinearUnit): number | undefined {
  const factor = shortFactors.get(unit)
  if (!factor) return undefined
  const above = n * factor.n
  const below = d * factor.d
  return Math.abs(above) <= Number.MAX_SAFE_INTEGER && below <= Number.MAX_SAFE_INTEGER ? above / below : undefined
}

/** A value in one unit said in another of the same kind; throws a RangeError between kinds. */
export function convert(value: Exact, from: LinearUnit, to: LinearUnit): Exact {
  if (units[from].si !== units[to].si) throw new RangeError(`${from} cannot be said in ${to}`)
  const { factor, zero } = units[to]
  const scaled = over(toSiExact(value, from), factor)
  return zero ? minus(scaled, zero) : scaled
}
