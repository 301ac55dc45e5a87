// Measurements found in a text, as the API gives them.
import { z } from 'zod'
import { limits } from './text'

export const measurementSchema = z.object({
  raw: z.string(),
  /** UTF-16 code units in the text as sent, or in the plain text of a post, end exclusive. */
  start: z.int(), end: z.int(),
  kind: z.enum(['length', 'drill', 'torque', 'pressure', 'angle', 'temperature', 'rivet', 'bolt', 'thread', 'gauge']),
  value: z.number(), max: z.number().optional(), exact: z.string().optional(), unit: z.string(),
  si: z.object({ value: z.number(), unit: z.enum(['m', 'N·m', 'Pa', 'rad', 'K']), max: z.number().optional() }),
  inches: z.number().optional(), diameter: z.number().optional(), length: z.number().optional(), grip: z.number().optional(),
})

const longest = 4 * limits.body
export const measurementsInputSchema = z.strictObject({ text: z.string().max(longest, `At most ${longest.toLocaleString('en')} characters.`) })
export const measurementsResultSchema = z.object({ measurements: z.array(measurementSchema) })

export type Measurement = z.infer<typeof measurementSchema>
export type MeasurementsResult = z.infer<typeof measurementsResultSchema>
