// How the cases beside this file write down what a text holds, and how an answer is held against it. Factors are the rounded
// ones printed in NIST SP 811 (2008), appendix B.8, so that the parser's own exact ones are checked from outside.
import type { Measurement } from '@/lib/domain/measurements/measurement'

/** One thing a text holds: SI value, and its upper end when it is a range. `optional`: may be found or not, but only as this kind. */
export interface Expected { raw: string; kind: string; si: number; max?: number; length?: number; optional?: boolean }
export type Case = readonly [text: string, ...expected: Expected[]]

const one = (kind: string, factor: number) => (raw: string, low: number, high?: number): Expected =>
  ({ raw, kind, si: low * factor, ...(high === undefined ? {} : { max: high * factor }) })

export const inches = one('length', 0.0254)
export const mm = one('length', 0.001)
export const drill = one('drill', 0.0254)
export const inLb = one('torque', 0.1129848)
export const ftLb = one('torque', 1.355818)
export const nm = one('torque', 1)
export const psi = one('pressure', 6894.757)
export const pascal = one('pressure', 1)
export const degrees = one('angle', Math.PI / 180)
export const kelvin = one('temperature', 1)
export const thread = one('thread', 0.0254)
export const gauge = one('gauge', 0.0254)
/** Diameter, and length (rivet) or grip (bolt), in inches. */
export const rivet = (raw: string, diameter: number, length?: number): Expected => ({ raw, kind: 'rivet', si: diameter * 0.0254, ...(length === undefined ? {} : { length }) })
export const bolt = (raw: string, diameter: number, length?: number): Expected => ({ raw, kind: 'bolt', si: diameter * 0.0254, ...(length === undefined ? {} : { length }) })
export const fahrenheit = (raw: string, low: number, high?: number): Expected => kelvin(raw, (low + 459.67) / 1.8, high === undefined ? undefined : (high + 459.67) / 1.8)
export const celsius = (raw: string, low: number, high?: number): Expected => kelvin(raw, low + 273.15, high === undefined ? undefined : high + 273.15)
export const maybe = (expected: Expected): Expected => ({ ...expected, optional: true })

const near = (a: number | undefined, b: number | undefined): boolean =>
  a === undefined || b === undefined ? a === b : Math.abs(a - b) <= 1e-6 * Math.max(Math.abs(a), Math.abs(b)) + 1e-12

function meets(found: Measurement, expected: Expected): boolean {
  const size = expected.length === undefined || near(found.kind === 'bolt' ? found.grip ?? found.length : found.length, expected.length)
  return found.raw === expected.raw && found.kind === expected.kind && near(found.si.value, expected.si) && near(found.si.max, expected.max) && size
}

/** What is wrong with an answer, in a line; undefined when all that must be there is there, and nothing else. */
export function complaint(found: readonly Measurement[], expected: readonly Expected[]): string | undefined {
  const left = [...found]
  for (const item of expected) {
    const at = left.findIndex((measurement) => meets(measurement, item))
    if (at >= 0) left.splice(at, 1)
    else if (!item.optional) return `missing ${item.kind} "${item.raw}"; found ${describe(found)}`
  }
  return left.length > 0 ? `not expected: ${describe(left)}` : undefined
}

const describe = (found: readonly Measurement[]): string =>
  found.map((m) => `${m.kind} "${m.raw}" ${m.si.value}${m.si.max === undefined ? '' : `..${m.si.max}`} ${m.length ?? ''} ${m.grip ?? ''}`).join(', ') || 'nothing'
