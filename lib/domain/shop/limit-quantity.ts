// How a kit maker's value reads in inch and metric, made of what the tables themselves show. Also in diameters of the fastener ("2 D").
import { amount, amountRange, atLeast, length, lengthRange, torque, words, type Quantity } from './shop-result'
import type { ShopValue } from './shop-table'
import { convert } from './unit-conversion'

/** Diameters of the rivet or bolt: a limit so given is worked out for the diameter asked for. */
export const DIAMETERS = 'D'

/** One number, least, most or both, or words. Lengths are in inches, torques in inch-pounds. */
export function limitQuantity(value: ShopValue, unit: string): Quantity {
  const { number, min, max, label } = value
  if (number === undefined && min === undefined && max === undefined) return words(label ?? '')
  if (number !== undefined) return one(number, unit)
  if (min !== undefined && max !== undefined) return range(min, max, unit)
  if (min !== undefined && unit === 'in') return atLeast(min)
  const { display } = one(min ?? max ?? 0, unit)
  const bound = min === undefined ? 'at most' : 'at least'
  return { value: min === undefined ? { max: max ?? 0 } : { min }, unit, display: { inch: `${bound} ${display.inch}`, metric: `${bound} ${display.metric}` } }
}

/** A limit in diameters as a length for one diameter in inches. */
export function inDiameters({ number, min, max }: ShopValue, diameter: number): Quantity {
  const scaled = Object.fromEntries(Object.entries({ number, min, max }).flatMap(([name, value]) => (value === undefined ? [] : [[name, value * diameter] as const])))
  return limitQuantity(scaled, 'in')
}

function one(value: number, unit: string): Quantity {
  if (unit === 'in') return length(value)
  if (unit === 'lbf-in') return torque(value)
  return withMetric(amount(value, unit), unit, [value])
}

function range(min: number, max: number, unit: string): Quantity {
  if (unit === 'in') return lengthRange(min, max)
  if (unit === 'lbf-in') return torque(min, max)
  return withMetric(amountRange(min, max, unit), unit, [min, max])
}

/** Units that are not lengths or torques and that metric shops read in another. */
const metricOf: Readonly<Record<string, string>> = { '°F': '°C', ft: 'm', psi: 'kPa' }

function withMetric(shown: Quantity, unit: string, values: readonly number[]): Quantity {
  const metric = metricOf[unit]
  const [low, high] = values.map((value) => (metric ? convert(value, unit, metric) : null)).map((value) => (value == null ? null : Number(value.toFixed(1))))
  if (metric === undefined || low == null) return shown
  return { ...shown, display: { inch: shown.display.inch, metric: (high == null ? amount(low, metric) : amountRange(low, high, metric)).display.metric } }
}
