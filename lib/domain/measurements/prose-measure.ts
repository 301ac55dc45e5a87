// What a page adds to a measurement that somebody wrote in a sentence. Their own writing is never replaced: a misread must be seen by
// whoever reads. Where it is added, and with which marks, is lib/render.
import { formatMeasurement, type FirstSystem } from './format-measurement'
import type { Measurement } from './measurement'
import { units } from './units'

export interface ProseMeasure {
  /** The system it was written in. */
  writtenIn: FirstSystem
  /** The same in the other system, for a reader who wants that one first. */
  lead: string
  /** What was left unsaid and belongs to it: " in" behind a bare 3/16, " · 0.1285" behind a drill's number; or ''. */
  more: string
  /** The same otherwise, for a reader who takes it as written; parts joined by " · ". */
  also: string
}

/** Null for what says no quantity in two systems: designations, threads, wire gauges, angles. */
export function proseMeasure(measurement: Measurement): ProseMeasure | null {
  const writtenIn = systemOf(measurement)
  if (!writtenIn) return null
  const { text, also } = formatMeasurement(measurement, writtenIn)
  const lead = formatMeasurement(measurement, writtenIn === 'inch' ? 'metric' : 'inch').text
  return { writtenIn, lead, more: unsaid(measurement, text), also: measurement.unit === 'thou' ? `${text} · ${also}` : also }
}

function systemOf({ kind, unit }: Measurement): FirstSystem | null {
  if (kind === 'drill') return 'inch'
  if (kind !== 'length' && kind !== 'torque' && kind !== 'pressure' && kind !== 'temperature') return null
  const system = unit === 'AWG' ? 'both' : units[unit].system
  return system === 'both' ? null : system
}

/** A bare number was read as inches: saying so lets a builder object. Letters and inch marks say it themselves. */
function unsaid({ kind, unit, raw }: Measurement, text: string): string {
  if (kind === 'drill') return ` · ${text.slice(text.lastIndexOf(' · ') + 3)}`
  return unit === 'in' && !/[\p{L}"'“”‘’″′]/u.test(raw) ? ' in' : ''
}
