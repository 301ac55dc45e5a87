// The twist drills of ANSI/ASME B94.11M (content/shop/drills.json): number, letter and fraction sizes, found by name or by measure.
import data from '@/content/shop/drills.json'
import { fractionOfInch, inchesOf } from './exact-fraction'

export type DrillSeries = 'number' | 'letter' | 'fraction'

export interface Drill {
  /** "#30", "F", "3/16". */
  name: string
  inches: number
  series: DrillSeries
  /** Key of its source in content/shop/sources.json. */
  cite: string
}

function listed(series: 'number' | 'letter'): Drill[] {
  return data[series].rows.map(([name, inches]) => ({ name: String(name), inches: Number(inches), series, cite: data[series].cite }))
}

function fractions(): Drill[] {
  const { from, to, denominator, cite } = data.fraction
  return Array.from({ length: to - from + 1 }, (_, index) => {
    const inches = (from + index) / denominator
    return { name: fractionOfInch(inches) ?? String(inches), inches, series: 'fraction' as const, cite }
  })
}

/** Every drill, smallest first. */
export const DRILLS: readonly Drill[] = [...listed('number'), ...listed('letter'), ...fractions()].sort((a, b) => a.inches - b.inches)

const byName = new Map(DRILLS.map((drill) => [drill.name.toLowerCase(), drill]))

/** A drill by its name: "#30", "No. 30", "number 30", "f", "3/16". Null when there is none; a bare 30 is no drill. */
export function findDrill(text: string): Drill | null {
  const plain = text.trim().toLowerCase()
  const number = /^(?:#|no\.?|nr\.?|number)\s?(\d{1,2})$/.exec(plain)
  const name = number ? `#${Number(number[1])}` : /^\d{1,2}\/\d{1,2}$/.test(plain) ? (fractionOfInch(safeInches(plain)) ?? plain) : plain.replace(/^letter /, '')
  return /^\d+$/.test(name) ? null : (byName.get(name) ?? null)
}

function safeInches(text: string): number {
  return text.endsWith('/0') || text.endsWith('/00') ? NaN : inchesOf(text)
}

const TIE = 1e-9

/** The drills of one diameter: E and 1/4 are both 0.250. */
export function drillsOf(inches: number, drills: readonly Drill[] = DRILLS): Drill[] {
  return drills.filter((drill) => Math.abs(drill.inches - inches) < TIE)
}

/** The next drill under (-1) or over (+1) a diameter, never of that diameter. */
export function nextDrill(inches: number, direction: -1 | 1, drills: readonly Drill[] = DRILLS): Drill | null {
  if (direction === 1) return drills.find((drill) => drill.inches > inches + TIE) ?? null
  return drills.findLast((drill) => drill.inches < inches - TIE) ?? null
}

/** The drill nearest to a diameter; of two as near, the smaller: a hole can be opened, not closed. */
export function nearestDrill(inches: number, drills: readonly Drill[] = DRILLS): Drill | null {
  let best: Drill | null = null
  for (const drill of drills) {
    if (!best || Math.abs(drill.inches - inches) < Math.abs(best.inches - inches) - TIE) best = drill
  }
  return best
}
