// Tightening torque of nuts and bolts in inch-pounds: look-up and wrench arithmetic. What the table doesn't list has no value; nothing is extrapolated.
import data from '@/content/shop/torque.json'
import { inchesOf } from './exact-fraction'
import { machineScrewDiameter } from './screw-clearance'

export type NutKind = 'tension' | 'shear'

export interface TorqueRange {
  min: number
  max: number
  /** Maximum allowable tightening torque, for lining up a cotter hole and no more. */
  most: number
  /** The AC marks the range as its own estimate. */
  estimated: boolean
}

/** The one-inch thread of the Army tables. Here only to say that Table 7-1 has no torque for it. */
const UNLISTED_INCH = '1-12'

/** Every thread that any list here knows, fine series first. */
export const TORQUE_THREADS: readonly string[] = [...new Set([...data.table.rows.map(({ thread }) => thread), ...data.prevailing.flatMap(({ rows }) => rows.map(([thread]) => String(thread))), UNLISTED_INCH])]

/** AC 43.13-1B Table 7-1 for a thread ("10-32"), or null where it lists none. */
export function boltTorque(thread: string, nut: NutKind): TorqueRange | null {
  const row = data.table.rows.find((known) => known.thread === thread)
  const [min, max, most] = row?.[nut] ?? []
  if (!row || min === undefined || max === undefined || most === undefined) return null
  return { min, max, most, estimated: (row.estimated ?? []).includes(nut) }
}

/** Least prevailing torque of a self-locking nut, one for each source that lists the thread. */
export function prevailingTorque(thread: string): { cite: string; least: number }[] {
  return data.prevailing.flatMap(({ cite, rows }) => rows.filter(([known]) => known === thread).map(([, least]) => ({ cite, least: Number(least) })))
}

/** Nominal diameter in inches of "10-32", "1/4-28", "1-1/8-12". */
export function threadDiameter(thread: string): number {
  const size = thread.slice(0, thread.lastIndexOf('-'))
  return (['8', '10'].includes(size) ? machineScrewDiameter(Number(size)) : null) ?? inchesOf(size)
}

export type ExtensionDirection = 'longer' | 'shorter' | 'square'

/** What the wrench reads for `target` at the nut: Tw = Ta L / (L + A). An extension that shortens the lever counts as negative; at 90 degrees it changes nothing. */
export function wrenchReading(target: number, lever: number, extension: number, direction: ExtensionDirection): number {
  return target * lever / effectiveLever(lever, extension, direction)
}

/** What arrives at the nut when the wrench reads `reading`: the same turned round. */
export function torqueAtNut(reading: number, lever: number, extension: number, direction: ExtensionDirection): number {
  return reading * effectiveLever(lever, extension, direction) / lever
}

function effectiveLever(lever: number, extension: number, direction: ExtensionDirection): number {
  return direction === 'square' ? lever : direction === 'longer' ? lever + extension : lever - extension
}
