// AN bolts by designation: AN3-5A is 3/16 in, 21/32 in long with a 1/4 in grip. Length and grip follow a rule known for AN3 to AN6 only.
import data from '@/content/shop/bolts.json'
import { inchesOf } from './exact-fraction'

export interface BoltLength {
  /** "AN3-5". */
  designation: string
  length: number
  grip: number
  /** The figure stands printed in a source; otherwise it is arithmetic on the rule. */
  printed: boolean
}

export interface BoltDesignation extends BoltLength {
  bolt: string
  dash: number
  material: string
  headMark: string
  headDrilled: boolean
  shankDrilled: boolean
}

export const BOLTS: readonly string[] = data.threads.rows.map(({ bolt }) => bolt)
/** Bolts whose lengths the rule covers. */
export const BOLTS_WITH_LENGTHS: readonly string[] = data.lengths.rows.map(({ bolt }) => bolt)

/** Thread and nominal diameter of an AN bolt ("AN3"), or null. */
export function boltThread(bolt: string): { nominal: string; inches: number; thread: string; threadsPerInch: number } | null {
  const row = data.threads.rows.find((known) => known.bolt === bolt)
  return row ? { nominal: row.nominal, inches: inchesOf(row.nominal), thread: row.thread, threadsPerInch: Number(row.thread.split('-').at(-1)) } : null
}

/** The bolt whose thread this is: "10-32" is AN3. Null when the table has none. */
export function boltOfThread(thread: string): string | null {
  return data.threads.rows.find((row) => row.thread === thread)?.bolt ?? null
}

/**
 * Length and grip in inches. The dash number counts eighths, its tens whole inches: -12 is 1-2/8, and no dash ends in 8 or 9.
 * Null where the rule has no value: other bolts, other dashes. Nothing is extrapolated.
 */
export function boltLength(bolt: string, dash: number): BoltLength | null {
  const row = data.lengths.rows.find((known) => known.bolt === bolt)
  if (!row || !Number.isInteger(dash) || dash < row.firstDash || dash > data.lengths.lastDash || dash % 10 > 7) return null
  const length = Math.floor(dash / 10) + (dash % 10) / 8 + inchesOf(row.offset)
  const designation = `${bolt}-${dash}`
  return { designation, length, grip: length - inchesOf(row.thread), printed: data.lengths.printed.includes(designation) }
}

/** Every length of a bolt, shortest first. */
export function boltLengths(bolt: string): BoltLength[] {
  return Array.from({ length: data.lengths.lastDash + 1 }, (_, dash) => boltLength(bolt, dash)).filter((entry) => entry !== null)
}

/** Reads AN3-5A, AN4H-12, AN5DD7A, AN6C-10A; null where the designation or its length isn't known. */
export function decodeBolt(text: string): BoltDesignation | null {
  const match = /^AN(\d{1,2})(C|DD)?(H)?-?(\d{1,2})(A)?$/.exec(text.trim().toUpperCase().replace(/\s+/g, ''))
  if (!match) return null
  const [, size = '', material = '', head, dashText = '', shank] = match
  const [bolt, dash] = [`AN${Number(size)}`, Number(dashText)]
  const length = boltLength(bolt, dash)
  const mark = data.marks.rows.find((row) => row.code === material)
  if (!length || !mark) return null
  return { ...length, bolt, dash, material: mark.material, headMark: mark.mark, headDrilled: head !== undefined, shankDrilled: shank === undefined }
}
