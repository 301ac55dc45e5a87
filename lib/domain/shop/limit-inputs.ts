// For which inputs of a table a kit maker's limit holds. Values count, not spellings: 1/8 and 0.125 in are the same rivet.
import { parseExact } from './exact-fraction'
import { readInputs, type InputError, type ShopInput, type ShopInputs } from './shop-input'
import type { ShopTable } from './shop-table'

type Declared = Pick<ShopTable, 'inputs'>

/** Inputs a limit names, as the table takes them; blanks are left out. Unknown names and values out of limits are errors. */
export function readLimitInputs({ inputs: declared }: Declared, raw: Readonly<Record<string, string>>): { ok: true; inputs: Record<string, string> } | { ok: false; errors: InputError[] } {
  const given = Object.fromEntries(Object.entries(raw).map(([name, text]) => [name, text.trim()] as const).filter(([, text]) => text !== ''))
  const named = declared.filter(({ name }) => Object.hasOwn(given, name))
  const unknown = Object.keys(given).filter((name) => !declared.some((input) => input.name === name))
  const errors = [
    ...unknown.map((name) => ({ path: name, message: `There is no input of this name. There are: ${declared.map((input) => input.name).join(', ')}.` })),
    ...named.flatMap((input) => readNamed(input, given[input.name] ?? '').errors),
  ]
  // A choice is kept by its value, so that a link made of it and the list of limits read the same.
  const kept = named.map((input): [string, string] => [input.name, input.kind === 'choice' ? String(readNamed(input, given[input.name] ?? '').value) : given[input.name] ?? ''])
  return errors.length > 0 ? { ok: false, errors } : { ok: true, inputs: Object.fromEntries(kept) }
}

/** True when every input that `named` names has that value in what a table has read. `{}` holds for all. */
export function holdsFor({ inputs: declared }: Declared, named: Readonly<Record<string, string>>, read: ShopInputs): boolean {
  return Object.entries(named).every(([name, text]) => {
    const input = declared.find((each) => each.name === name)
    const present = read[name]
    return input !== undefined && present !== undefined && isSame(input, text, present)
  })
}

/** The same text for the same inputs, however they are spelled. */
export function limitKey({ inputs: declared }: Declared, named: Readonly<Record<string, string>>): string {
  return JSON.stringify(declared.flatMap((input) => {
    const text = named[input.name]
    return text === undefined ? [] : [[input.name, readNamed(input, text).value ?? text]]
  }))
}

/** The size in inches that a text gives an input in inches, or null: a choice such as 1/8 counts as its length. */
export function inchesOfInput(input: ShopInput, text: string): number | null {
  if (input.unit !== 'in') return null
  const { value } = readNamed(input, text)
  if (typeof value === 'number') return value
  if (value !== undefined) return parseExact(value)?.valueOf() ?? null
  const length = readNamed({ name: input.name, label: input.label, unit: 'in', kind: 'length', default: null }, text).value
  return typeof length === 'number' ? length : null
}

function isSame(input: ShopInput, text: string, present: string | number): boolean {
  const [wanted, inches] = [readNamed(input, text).value, inchesOfInput(input, text)]
  if (typeof present === 'number') return typeof wanted === 'number' && isClose(wanted, present)
  const size = inches === null ? null : inchesOfInput(input, present)
  return wanted === present || (inches !== null && size !== null && isClose(inches, size))
}

const isClose = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-9 * Math.max(1, Math.abs(a))

function readNamed(input: ShopInput, text: string): { value?: string | number | undefined; errors: InputError[] } {
  const read = readInputs([input], { [input.name]: text })
  return read.ok ? { value: read.inputs[input.name], errors: [] } : { errors: read.errors }
}
