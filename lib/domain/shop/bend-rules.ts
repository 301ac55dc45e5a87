// Sheet bends: setback, bend allowance, flat length, least radius by alloy and temper. Lengths in inches, angles in degrees through which the metal is bent.
import data from '@/content/shop/bends.json'

export const BEND_ALLOYS: readonly string[] = data.radii.rows.map(({ alloy }) => alloy)
export const BEND_THICKNESSES: readonly number[] = data.thicknesses

/** K of AC 43.13-1B: the tangent of half the angle the metal is bent through. */
export const kFactor = (degrees: number): number => Math.tan((degrees / 2) * (Math.PI / 180))

/** From the bend tangent line to the mold point: K (R + T). */
export const setback = (radius: number, thickness: number, degrees: number): number => kFactor(degrees) * (radius + thickness)

/** Metal used up in the bend, one for each formula: (a R + b T) N. */
export function bendAllowances(radius: number, thickness: number, degrees: number): { cite: string; allowance: number; how: string }[] {
  return data.allowances.map(({ cite, r, t }) => ({ cite, allowance: (r * radius + t * thickness) * degrees, how: `(${r} R + ${t} T) × ${degrees}` }))
}

/** The handbook's plain form: that part of a circle through the middle of the sheet. */
export const circleAllowance = (radius: number, thickness: number, degrees: number): number => (2 * Math.PI * (radius + thickness / 2) * degrees) / 360

/** Flats and bends laid end to end. */
export function developedLength(flats: readonly number[], allowance: number, bends: number): number {
  return flats.reduce((sum, flat) => sum + flat, 0) + allowance * bends
}

export interface RadiusRow {
  /** The table's own sheet thickness. */
  thickness: number
  minTimes: number
  maxTimes: number
}

/** The row for a sheet: its own where the table has it, else the rows on each side; nothing is worked out between them. */
export function radiusRows(alloy: string, thickness: number): RadiusRow[] {
  const row = data.radii.rows.find((known) => known.alloy === alloy)
  const rows = data.thicknesses.flatMap((listed, index) => {
    const [minTimes, maxTimes] = row?.timesThickness[index] ?? []
    return minTimes === undefined || maxTimes === undefined ? [] : [{ thickness: listed, minTimes, maxTimes }]
  })
  const exact = rows.find((entry) => Math.abs(entry.thickness - thickness) < 5e-5)
  if (exact) return [exact]
  const [thinner, thicker] = [rows.findLast((entry) => entry.thickness < thickness), rows.find((entry) => entry.thickness > thickness)]
  return thinner && thicker ? [thinner, thicker] : []
}
