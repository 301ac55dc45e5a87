// Words for the search index that stand for a measurement's value: what says the same size has one in common, whatever its unit.
import type { Measurement } from './measurement'
import { angleTolerance, heatTolerance, ratioTolerance } from './same-measure'

/**
 * The grid points on both sides of a value (one if it lies on a point), so that values nearer than a step share one:
 * #30, 0.1285 and 3.26 mm all hold "in=0.1285". A range holds the tokens of both ends; a rivet or bolt also those of its diameter.
 */
export function measureTokens(measurement: Measurement): string[] {
  const { kind, si, exact = '', value, max } = measurement
  switch (kind) {
    case 'length': case 'drill': return ends(si, (metres) => sizeTokens(metres / 0.0254))
    case 'torque': return ends(si, (newtonMetres) => ratioTokens('nm', newtonMetres))
    case 'pressure': return ends(si, (pascals) => ratioTokens('pa', pascals))
    case 'angle': return ends(si, (radians) => stepTokens('deg', radians / angleTolerance))
    case 'temperature': return ends(si, (kelvins) => stepTokens('k', kelvins / heatTolerance))
    case 'thread': return [`thread=${exact.toLowerCase()}`]
    case 'gauge': return max === undefined ? [`awg=${value}`] : [`awg=${value}`, `awg=${max}`]
    case 'rivet': case 'bolt': return [...designationTokens(measurement), ...sizeTokens(measurement.diameter ?? 0)]
  }
}

const ends = ({ value, max }: Measurement['si'], tokens: (si: number) => string[]): string[] =>
  max === undefined ? tokens(value) : [...new Set([...tokens(value), ...tokens(max)])]

const finest = 0.0005
const fineBelow = 0.5

/** Half a thousandth up to half an inch, then twice as coarse with each doubling; a point at the border belongs to both grids. */
function sizeTokens(inches: number): string[] {
  const step = inches < fineBelow ? finest : finest * 2 ** (Math.floor(Math.log2(inches / fineBelow)) + 1)
  return neighbours(inches / step).map((point) => `in=${(point * step).toFixed(4)}`)
}

const ratioTokens = (unit: string, si: number): string[] => (si > 0 ? stepTokens(unit, Math.log(si) / ratioTolerance) : [`${unit}=none`])
const stepTokens = (unit: string, steps: number): string[] => neighbours(steps).map((point) => `${unit}=${point}`)

/** A point missed only by a double's rounding is met. */
const rounding = 1e-6

function neighbours(steps: number): number[] {
  const below = Math.floor(steps + rounding)
  const above = Math.ceil(steps - rounding)
  return below === above ? [below] : [below, above]
}

/** With and without the length, so that AN470AD4 finds AN470AD4-6 and MS20470AD4-6. */
function designationTokens({ kind, diameter = 0, length, grip }: Measurement): string[] {
  const size = `${kind}=${diameter.toFixed(4)}`
  const second = kind === 'bolt' ? grip ?? length : length
  return second === undefined ? [size] : [size, `${size}x${second.toFixed(4)}`]
}
