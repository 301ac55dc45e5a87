// What a measurement found in a text is, as stored, shown and sent. Finding them is find-measurements.ts.

/** Raised whenever the same text may give another answer: stored rows of an older version are found anew. */
export const parserVersion = 2

export type MeasurementKind = 'length' | 'drill' | 'torque' | 'pressure' | 'angle' | 'temperature' | 'rivet' | 'bolt' | 'thread' | 'gauge'
export type SiUnit = 'm' | 'N·m' | 'Pa' | 'rad' | 'K'
export type UnitName =
  | 'in' | 'ft' | 'yd' | 'thou' | 'mm' | 'cm' | 'm' | 'µm' | 'in-lb' | 'ft-lb' | 'oz-in' | 'N·m' | 'psi' | 'ksi' | 'bar' | 'mbar' | 'hPa' | 'kPa' | 'MPa'
  | 'inHg' | '°' | '°F' | '°C' | 'AWG'

/** A quantity with its unit inside a text. Offsets are UTF-16 code units, end exclusive: text.slice(start, end) is raw. */
export interface Measurement {
  raw: string
  start: number
  end: number
  kind: MeasurementKind
  /** In `unit`; the lower end of a range. Of a drill, thread, rivet or bolt its nominal diameter in inches; of a gauge its number. */
  value: number
  /** Upper end of a range, in `unit`. */
  max?: number
  /** What the decimal says less well: 3/16, 2 1/8, 1/8–3/16, #30, F, 10-32, AN470AD4-6. */
  exact?: string
  unit: UnitName
  si: { value: number; unit: SiUnit; max?: number }
  /** Of everything that has a length or diameter, the lower end of a range. */
  inches?: number
  /** Rivet and bolt, inches. */
  diameter?: number
  length?: number
  grip?: number
}
