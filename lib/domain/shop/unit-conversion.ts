// Conversion of units with exact rational factors (NIST SP 811; content/shop/units.json). There and back gives what went in.
import data from '@/content/shop/units.json'
import Fraction from 'fraction.js'

export interface UnitKind {
  kind: string
  units: readonly string[]
}

interface Unit {
  kind: string
  factor: Fraction
  zero: Fraction
}

const zeroes: Record<string, string> = data.zeroes
const units = new Map<string, Unit>(data.kinds.flatMap(({ kind, units: rows }) => rows.map(([name = '', factor = '1']) =>
  [name, { kind, factor: new Fraction(factor), zero: new Fraction(zeroes[name] ?? '0') }] as const)))

/** Units by what they measure, in the order they are offered. */
export const UNIT_KINDS: readonly UnitKind[] = data.kinds.map(({ kind, units: rows }) => ({ kind, units: rows.map(([name = '']) => name) }))

export const kindOfUnit = (unit: string): string | null => units.get(unit)?.kind ?? null

/** `value` of `from` in `to`, exactly; null where the two don't measure the same. */
export function convertExact(value: Fraction, from: string, to: string): Fraction | null {
  const [source, target] = [units.get(from), units.get(to)]
  if (!source || !target || source.kind !== target.kind) return null
  return value.mul(source.factor).add(source.zero).sub(target.zero).div(target.factor)
}

/** The same for plain numbers. */
export function convert(value: number, from: string, to: string): number | null {
  return convertExact(new Fraction(value), from, to)?.valueOf() ?? null
}

/** A unit whose factor is a rounded published figure and no definition. */
export const roundedSource = (unit: string): string | null => new Map(Object.entries<string>(data.rounded)).get(unit) ?? null
