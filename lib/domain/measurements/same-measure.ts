// When two measurements say the same size, whatever the unit: #30, 0.1285 and 3.26 mm. How near is near enough is search's need, not a fit's.
import type { Measurement } from './measurement'

/** A drill's half thousandth; a thousandth part of anything longer. Inches. */
export const sizeTolerance = (inches: number): number => Math.max(0.0005, Math.abs(inches) / 1000)
/** Torque and pressure are rounded when they are converted: half a percent, as a natural logarithm. */
export const ratioTolerance = Math.log(1.005)
export const angleTolerance = Math.PI / 180 / 4
export const heatTolerance = 0.5

/** Two ranges agree at both ends; a single value agrees with either end of a range. Drills and lengths are one kind; designations agree by what they say. */
export function sameMeasure(a: Measurement, b: Measurement): boolean {
  if (a.kind !== b.kind && !(isSize(a) && isSize(b))) return false
  switch (a.kind) {
    case 'thread': return a.exact === b.exact
    case 'gauge': return a.value === b.value && a.max === b.max
    case 'rivet': case 'bolt': return agrees(a.diameter, b.diameter) && agrees(a.length, b.length) && agrees(a.grip, b.grip)
    default: return sameEnds(a, b)
  }
}

const isSize = ({ kind }: Measurement): boolean => kind === 'length' || kind === 'drill'

const agrees = (a: number | undefined, b: number | undefined): boolean => a === undefined || b === undefined || Math.abs(a - b) < sizeTolerance(a)

function sameEnds(a: Measurement, b: Measurement): boolean {
  const near = (left: number, right: number): boolean => isNear(a.kind, left, right)
  if (a.si.max !== undefined && b.si.max !== undefined) return near(a.si.value, b.si.value) && near(a.si.max, b.si.max)
  const [single, range] = a.si.max === undefined ? [a, b] : [b, a]
  return near(single.si.value, range.si.value) || (range.si.max !== undefined && near(single.si.value, range.si.max))
}

function isNear(kind: Measurement['kind'], a: number, b: number): boolean {
  switch (kind) {
    case 'torque': case 'pressure': return a === b || (a > 0 && b > 0 && Math.abs(Math.log(a / b)) < ratioTolerance)
    case 'angle': return Math.abs(a - b) < angleTolerance
    case 'temperature': return Math.abs(a - b) < heatTolerance
    default: return Math.abs(a - b) / 0.0254 < sizeTolerance(Math.min(Math.abs(a), Math.abs(b)) / 0.0254)
  }
}
