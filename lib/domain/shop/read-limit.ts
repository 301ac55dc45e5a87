// Reads what a steward enters as a kit maker's limit: table, result, inputs, one number or a span or words, unit. Exact; no I/O.
import Fraction from 'fraction.js'
import { parseExact } from './exact-fraction'
import { readLimitInputs } from './limit-inputs'
import { DIAMETERS, limitQuantity } from './limit-quantity'
import { limitSense } from './limit-sense'
import type { MakerLimit } from './maker-limits'
import type { InputError } from './shop-input'
import type { ShopTable, ShopValue } from './shop-table'
import { shopTable } from './shop-tables'
import { convertExact } from './unit-conversion'

/** As typed; '' where nothing was. */
export interface LimitText {
  table: string
  result: string
  inputs: Readonly<Record<string, string>>
  value: { number: string; min: string; max: string; words: string }
  /** One of unitsFor(); '' means the result's own. */
  unit: string
}
type ReadLimit = Pick<MakerLimit, 'table' | 'result' | 'inputs' | 'value' | 'unit' | 'display'>
type Read<T> = { ok: true; given: T } | { ok: false; errors: InputError[] }

/** What a unit may be given in: its name as typed, and how units.json knows it. The first is the result's own. */
const givenIn: Readonly<Record<string, readonly { name: string; unit: string }[]>> = {
  'in': [{ name: 'in', unit: 'in' }, { name: 'mm', unit: 'mm' }],
  'lbf-in': [{ name: 'in-lb', unit: 'lbf-in' }, { name: 'ft-lb', unit: 'lbf-ft' }, { name: 'N·m', unit: 'N·m' }],
  '°F': [{ name: '°F', unit: '°F' }, { name: '°C', unit: '°C' }],
  'ft': [{ name: 'ft', unit: 'ft' }, { name: 'm', unit: 'm' }],
  'psi': [{ name: 'psi', unit: 'psi' }, { name: 'kPa', unit: 'kPa' }, { name: 'bar', unit: 'bar' }],
}

/** Tables whose results follow from the size asked for and from nothing a kit maker could limit. */
const withoutLimits = ['units', 'drills']
export const limitTables = (tables: readonly ShopTable[]): ShopTable[] => tables.filter(({ slug }) => !withoutLimits.includes(slug))

/** Units in which a result's limit may be given, the result's own first; lengths of a fastener also in its diameters. Empty for words. */
export function unitsFor(table: Pick<ShopTable, 'inputs' | 'results'>, result: string): string[] {
  const unit = table.results.find(({ name }) => name === result)?.unit ?? ''
  if (unit === '') return []
  const hasDiameter = unit === 'in' && table.inputs.some((input) => input.name === 'diameter' && input.unit === 'in')
  return [...(givenIn[unit]?.map(({ name }) => name) ?? [unit]), ...(hasDiameter ? [DIAMETERS] : [])]
}

/** Every mistake with the field it is in: table, result, inputs.<name>, value.number, value.min, value.max, value.words or unit. */
export function readLimit(text: LimitText): Read<ReadLimit> {
  const table = limitTables([shopTable(text.table)].filter((found) => found !== null))[0]
  if (!table) return refused('table', 'Choose the shop table that the limit is for.')
  const result = table.results.find(({ name }) => name === text.result)
  if (!result) return refused('result', `Choose what is limited: ${table.results.map(({ label }) => label.toLowerCase()).join(', ')}.`)
  const inputs = readLimitInputs(table, text.inputs)
  const units = unitsFor(table, result.name)
  const given = text.unit === '' ? (units[0] ?? '') : text.unit
  const unitErrors = given !== '' && !units.includes(given) ? [{ path: 'unit', message: units.length === 0 ? `${result.label} has no unit: write it in words.` : `The unit is one of ${units.join(', ')}.` }] : []
  const value = readValue(text.value, result.unit, given)
  const errors = [...(inputs.ok ? [] : inputs.errors.map(({ path, message }) => ({ path: `inputs.${path}`, message }))), ...unitErrors, ...(value.ok ? [] : value.errors)]
  if (errors.length > 0 || !inputs.ok || !value.ok) return { ok: false, errors }
  const unit = value.given.label !== undefined ? '' : given === DIAMETERS ? DIAMETERS : result.unit
  const bounded = boundedBy(value.given, table.slug, result.name)
  return { ok: true, given: { table: table.slug, result: result.name, inputs: inputs.inputs, ...limitQuantity(bounded, unit) } }
}

/** A plain number of a result that protects from too little is its least, of the other kind its most: so it reads, and so it is compared. */
function boundedBy(value: ShopValue, table: string, result: string): ShopValue {
  const sense = limitSense(table, result)
  if (value.number === undefined || sense === null || sense === 'both') return value
  return sense === 'least' ? { min: value.number } : { max: value.number }
}

function readValue({ number, min, max, words }: LimitText['value'], unit: string, given: string): Read<ShopValue> {
  const filled = [number !== '', min !== '' || max !== '', words !== ''].filter(Boolean).length
  if (filled === 0) return refused('value.number', 'Write the limit: one number, at least or at most, or words.')
  if (filled > 1) return refused('value.number', 'Write it in one way: one number, or at least and at most, or words.')
  if (words !== '') return { ok: true, given: { label: words } }
  const read = Object.entries({ number, min, max }).filter(([, text]) => text !== '').map(([name, text]) => ({ name, value: readNumber(text, unit, given) }))
  const errors = read.filter(({ value }) => value === null).map(({ name }) => ({ path: `value.${name}`, message: `Write a number above zero in ${given || 'figures'}, such as ${unit === 'in' ? '5/16, 0.3125 or 7.94' : '25 or 2.8'}.` }))
  if (errors.length > 0) return { ok: false, errors }
  const values: ShopValue = Object.fromEntries(read.flatMap(({ name, value }) => (value === null ? [] : [[name, value] as const])))
  if (values.min !== undefined && values.max !== undefined && values.min > values.max) return refused('value.max', 'At most must not be less than at least.')
  return { ok: true, given: values }
}

/** Converted exactly into the result's unit; null for what is no number, not above zero, or absurd. */
function readNumber(text: string, unit: string, given: string): number | null {
  const value = parseExact(text)
  const from = givenIn[unit]?.find(({ name }) => name === given)?.unit
  const converted = value && from && from !== unit ? convertExact(value, from, unit) : value
  return converted && converted.compare(new Fraction(0)) > 0 && converted.compare(new Fraction(1_000_000)) < 0 ? converted.valueOf() : null
}

const refused = (path: string, message: string): { ok: false; errors: InputError[] } => ({ ok: false, errors: [{ path, message }] })
