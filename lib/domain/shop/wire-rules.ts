// Wire of tin-plated copper: size by current, voltage drop, longest run. Amperes, volts, feet. Facts in content/shop/wire.json.
import data from '@/content/shop/wire.json'

export type WireRating = '105' | '150' | '200'

export interface Wire {
  /** "22" … "1", "0", "00", "000", "0000". */
  awg: string
  amps: Record<WireRating, number>
  ohmsPer1000ft: number
  circularMils: number
}

/** Every size of AC 43.13-1B Table 11-9, thinnest first. */
export const WIRES: readonly Wire[] = data.sizes.rows.map(([awg, amps105, amps150, amps200, ohms, mils]) => ({
  awg: String(awg), amps: { 105: Number(amps105), 150: Number(amps150), 200: Number(amps200) }, ohmsPer1000ft: Number(ohms), circularMils: Number(mils),
}))

export const findWire = (awg: string): Wire | null => WIRES.find((wire) => wire.awg === awg) ?? null

/** Volts lost along `feet` of wire at `amps`, at 20 °C. */
export const voltageDrop = (wire: Wire, feet: number, amps: number): number => (wire.ohmsPer1000ft / 1000) * feet * amps

/** The thinnest wire that carries the current in a bundle, or null past the end of the table. */
export const wireForCurrent = (amps: number, rating: WireRating): Wire | null => WIRES.find((wire) => wire.amps[rating] >= amps - 1e-9) ?? null

/**
 * The thinnest wire that keeps the drop. Compared to the hundredth of a volt, as the AC does: it passes 0.504 V for 0.5 V
 * (Table 11-7, row 2), and its resistances have no more figures than that.
 */
export function wireForDrop(allowed: number, feet: number, amps: number): Wire | null {
  const hundredths = (volts: number): number => Math.round(volts * 100)
  return WIRES.find((wire) => hundredths(voltageDrop(wire, feet, amps)) <= hundredths(allowed)) ?? null
}

/** Feet of wire that lose just the allowed volts. */
export const longestRun = (wire: Wire, allowed: number, amps: number): number => allowed / ((wire.ohmsPer1000ft / 1000) * amps)

/** The run shortened for a conductor warmer than 20 °C: L2 = 254.5 L1 / (234.5 + T2). */
export const warmRun = (feet: number, celsius: number): number => (data.warm.numerator * feet) / (data.warm.offset + celsius)

/** Volts that may be lost between bus and load, or null for a system the table doesn't list. */
export function allowedDrop(systemVolts: number, duty: 'continuous' | 'intermittent'): number | null {
  return data.allowed.rows.find(({ volts }) => volts === systemVolts)?.[duty] ?? null
}

/** The thicker of two wires. */
export const thicker = (a: Wire, b: Wire): Wire => (WIRES.indexOf(a) >= WIRES.indexOf(b) ? a : b)
