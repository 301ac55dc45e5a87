// Diameters of numbered machine screws, for asking whether a hole passes one. Not a drill: #8 the screw is 0.164, #8 the drill 0.199.
import { DRILLS, type Drill } from './drill-series'

/** The rule is recalled; the standard was not looked up. */
export const SCREW_SOURCE = { title: 'ASME B18.6.3 machine screws', section: 'basic diameter 0.060 + 0.013 n', year: '-', basis: 'memory' as const }

/** Numbers of machine screws there are. */
export const SCREWS = [0, 1, 2, 3, 4, 5, 6, 8, 10, 12] as const

/** Inches of a #0 to #12 machine screw, or null: #8 is 0.164. */
export function machineScrewDiameter(size: number): number | null {
  return Number.isInteger(size) && size >= 0 && size <= 12 ? Number((0.06 + 0.013 * size).toFixed(3)) : null
}

/** Whether a hole passes a screw at all, however tightly. */
export const passesScrew = (holeInches: number, size: number): boolean => holeInches >= (machineScrewDiameter(size) ?? Infinity) - 1e-9

/** The smallest drill that passes a screw. */
export function smallestDrillFor(size: number): Drill | null {
  return DRILLS.find((drill) => passesScrew(drill.inches, size)) ?? null
}
