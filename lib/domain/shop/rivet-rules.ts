// The arithmetic of solid rivets: hole, length for a grip, shop head, edge distance, pitch. Facts in content/shop/rivets.json.
// A check of a drawing that was given, not a way to design a repair.
import data from '@/content/shop/rivets.json'
import { findDrill, type Drill } from './drill-series'
import { inchesOf } from './exact-fraction'

export interface RivetHole {
  cite: string
  drill: Drill
}

export const RIVET_DIAMETERS: readonly string[] = data.diameters

function holesIn(lists: readonly { cite: string; rows: string[][] }[], diameter: string): RivetHole[] {
  return lists.flatMap(({ cite, rows }) => {
    const drill = findDrill(rows.find(([size]) => size === diameter)?.[1] ?? '')
    return drill ? [{ cite, drill }] : []
  })
}

/** Final holes for a solid rivet ("1/8"), one for each source that lists the size. */
export const finalHoles = (diameter: string): RivetHole[] => holesIn(data.holes, diameter)
export const pilotHoles = (diameter: string): RivetHole[] => holesIn(data.pilots, diameter)
export const blindHole = (diameter: string) => data.blind.rows.find((row) => row.diameter === diameter) ?? null

/** Inches: grip + 1.5 D; 5/16 in and over take 1/16 in more for every whole inch of a grip over 1 in. */
export function rivetLength(grip: number, diameter: number): number {
  const { leastDiameter, over, addPerInch } = data.longGrip
  const more = diameter >= inchesOf(leastDiameter) - 1e-9 && grip > over ? Math.floor(grip + 1e-9) * inchesOf(addPerInch) : 0
  return grip + data.length.allowanceD * diameter + more
}

const STEP = inchesOf(data.length.step)

/** The length on the shelf nearest to what is needed: sixteenths, never none. */
export const nearestStockLength = (needed: number): number => Math.max(1, Math.round(needed / STEP)) * STEP
/** The next length on the shelf that isn't shorter than what is needed. */
export const nextStockLength = (needed: number): number => Math.max(1, Math.ceil(needed / STEP - 1e-9)) * STEP

/** Driven head in inches, as drawn and at the least that is accepted. `alloy` '7050' must spread wider. */
export function shopHead(diameter: number, alloy: string) {
  const { widthD, heightD } = data.shopHead
  const least = data.shopHeadLeast
  return {
    width: widthD * diameter, height: heightD * diameter,
    leastWidth: (alloy === '7050' ? least.widthD7050 : least.widthD) * diameter, leastHeight: least.heightD * diameter,
  }
}

/** Least edge distance in inches, from the centre of the hole. */
export function leastEdge(diameter: number, head: 'protruding' | 'flush'): number {
  return data.edge[head].d * diameter
}

/** The stock diameter to start from: the first not under three times the sheet. Null when the sheet is too thick for the list. */
export function diameterForSheet(sheet: number): string | null {
  return data.diameters.find((size) => inchesOf(size) >= 3 * sheet - 1e-9) ?? null
}

/** A 2117 rivet in place of another alloy: one size (1/32 in) larger, up to a limit; null where the rule doesn't reach. */
export function replacementDiameter(alloy: string, diameter: number): number | null {
  const row = data.replace.rows.find((known) => known.alloy === alloy)
  return row && diameter <= inchesOf(row.upTo) + 1e-9 ? diameter + inchesOf(data.replace.step) : null
}
