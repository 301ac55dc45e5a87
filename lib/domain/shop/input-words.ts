// Inputs of a table in words: what was understood, and the query of a permanent link.
import { fractionOfInch } from './exact-fraction'
import type { RawInputs, ShopInput, ShopInputs } from './shop-input'
import type { ShopTable } from './shop-table'

type Declared = Pick<ShopTable, 'title' | 'inputs'>

/** "Grommet holes: bore, the side of the wire 3/8 in". Choices by their labels; what was left out is left out. */
export function readAs({ title, inputs: declared }: Declared, inputs: ShopInputs): string {
  const said = declared.flatMap((input) => {
    const value = inputs[input.name]
    return value === undefined ? [] : [`${lowerFirst(input.label)} ${valueWords(input, value)}`]
  })
  return said.length === 0 ? title : `${title}: ${said.join(' · ')}`
}

/** "thread 10-32 (AN3) · nut Tension: MS20365, AN310": some inputs as they were written, '' for none. */
export function inputWords({ inputs: declared }: Pick<ShopTable, 'inputs'>, named: Readonly<Record<string, string>>): string {
  return declared.flatMap(({ name, label, options, unit, kind }) => {
    const text = named[name]
    if (text === undefined) return []
    const said = options?.find(({ value }) => value === text)?.label ?? (kind !== 'choice' && /[\d.]$/.test(text) ? `${text} ${unit === 'lbf-in' ? 'in-lb' : unit}`.trim() : text)
    return [`${lowerFirst(label)} ${said}`]
  }).join(' · ')
}

function valueWords({ kind, unit, options = [] }: ShopInput, value: string | number): string {
  if (typeof value === 'string') return options.find((option) => option.value === value)?.label ?? value
  if (kind === 'torque') return `${Number(value.toFixed(2))} in-lb`
  const shown = unit === 'in' ? (fractionOfInch(value) ?? String(Number(value.toFixed(4)))) : String(Number(value.toFixed(4)))
  return unit ? `${shown} ${unit}` : shown
}

/** AD and A stay as they are; "Bore" becomes "bore". */
export const lowerFirst = (text: string): string => (/^[A-Z][A-Z]/.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1))

/**
 * Every input as it was sent, or its default, so that a kept link gives the same answer after a default has changed. Only for
 * inputs that were read without errors.
 */
export function linkInputs({ inputs: declared }: Declared, raw: RawInputs): Record<string, string> {
  return Object.fromEntries(declared.flatMap(({ name, default: standing }) => {
    const sent = Object.hasOwn(raw, name) ? raw[name] : undefined
    const text = String(sent ?? standing ?? '').trim()
    return text === '' ? [] : [[name, text]]
  }))
}
