// When a torque or pressure lies within a range: 2.5 N·m within 20-25 in-lb. Both are cut into cells of two percent, and share one.
// Lengths have none: a size between two others is another size.
import type { Measurement } from '../measurements/measurement'

const cell = Math.log(1.02)
/** A range wider than about three to one says too little. */
const mostCells = 60

/** The cells that a range covers, its ends included; none of a single value. */
export function spannedCells({ kind, si }: Measurement): string[] {
  if (!hasCells(kind) || si.max === undefined || si.value <= 0) return []
  const [from, to] = [cellOf(si.value), cellOf(si.max)]
  return to - from >= mostCells ? [] : Array.from({ length: Math.max(0, to - from + 1) }, (_, i) => `${kind}[${from + i}`)
}

/** The cell in which a single value lies; none of a range. */
export function singleCells({ kind, si }: Measurement): string[] {
  return hasCells(kind) && si.max === undefined && si.value > 0 ? [`${kind}@${cellOf(si.value)}`] : []
}

/** What the other side calls the same cells: of a range the single values within, of a single value the ranges around it. */
export const facingCells = (measurement: Measurement): string[] =>
  [...spannedCells(measurement).map((name) => name.replace('[', '@')), ...singleCells(measurement).map((name) => name.replace('@', '['))]

const hasCells = (kind: Measurement['kind']): boolean => kind === 'torque' || kind === 'pressure'
const cellOf = (si: number): number => Math.floor(Math.log(si) / cell)
