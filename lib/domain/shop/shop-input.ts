// Inputs of shop tables: what a query or a form sends, read into numbers in the input's unit or refused with a sentence
// that says what is allowed. Free text is not searched for measurements here.
import Fraction from 'fraction.js'
import { findDrill } from './drill-series'
import { parseExact } from './exact-fraction'

/** length: inches · drill: inches, or a drill by name · torque: lbf-in · number: in the input's unit · part: a designation · exact: a number kept as written. */
export type InputKind = 'length' | 'drill' | 'torque' | 'number' | 'choice' | 'part' | 'exact'

export interface InputOption {
  value: string
  label: string
  aliases?: readonly string[]
}

export interface ShopInput {
  name: string
  label: string
  /** 'in', 'lbf-in', 'deg' …; '' for choices and designations. Limits are in this unit. */
  unit: string
  kind: InputKind
  min?: number
  max?: number
  options?: readonly InputOption[]
  /** What stands in the empty form; null: may be left out. */
  default: string | null
  /** A sentence for the form: an example, or what to measure. */
  hint?: string
}

export type RawInputs = Readonly<Record<string, string | number | null | undefined>>
/** Numbers are in the input's unit. An input that was left out is absent. */
export type ShopInputs = Readonly<Record<string, string | number>>
export interface InputError {
  path: string
  message: string
}
export type ReadInputs = { ok: true; inputs: ShopInputs } | { ok: false; errors: InputError[] }

const LONGEST = 60
const MM_PER_INCH = 25.4

/** Exact factors into the input's unit: 12.7 mm is half an inch and not a hair less. */
type UnitFactors = Readonly<Record<string, Fraction>>
function factors(table: Record<string, readonly string[]>): UnitFactors {
  return Object.fromEntries(Object.entries(table).flatMap(([factor, names]) => names.map((name) => [name, new Fraction(factor)] as const)))
}

const lengthUnits = factors({ 1: ['', 'in', 'in.', 'inch', 'inches', '"', '”', '″'], '5/127': ['mm'], '50/127': ['cm'], '1/1000': ['thou', 'mil'] })
/** A newton metre in inch-pounds: 1 / (0.45359237 × 9.80665 × 0.0254). */
const NM = '10000000000000000/1129848290276167'
const torqueUnits = factors({
  1: ['', 'in-lb', 'in-lbs', 'lbf-in', 'lb-in', 'inlb', 'in lb'], 12: ['ft-lb', 'ft-lbs', 'lbf-ft', 'lb-ft', 'ftlb', 'ft lb'], [NM]: ['nm', 'n·m', 'n-m', 'n m'],
})
const plainUnits = factors({ 1: [''] })
const numberUnits: Readonly<Record<string, UnitFactors>> = {
  deg: factors({ 1: ['', 'deg', '°', 'degrees'] }), ft: factors({ 1: ['', 'ft', 'feet'], '1250/381': ['m'], '1/12': ['in'] }),
  A: factors({ 1: ['', 'a', 'amp', 'amps'], '1/1000': ['ma'] }), V: factors({ 1: ['', 'v', 'volt', 'volts'], '1/1000': ['mv'] }), '°C': factors({ 1: ['', 'c', '°c'] }),
}
const example: Record<InputKind, string> = {
  length: 'such as 3/16, 0.1875 or 4.76 mm', drill: 'such as #30, F, 3/16, 0.1285 or 3.3 mm', torque: 'such as 25 in-lb or 2.8 N·m',
  number: 'in figures', choice: '', part: 'such as AN3-5A', exact: 'such as 3/16 or 12.5',
}

/**
 * Reads what was sent against the declared inputs. A missing field takes its default; an empty one is an error unless the
 * input may be left out. Fields that are not declared are errors too. Never throws.
 */
export function readInputs(declared: readonly ShopInput[], raw: RawInputs): ReadInputs {
  const errors: InputError[] = Object.keys(raw)
    .filter((name) => !declared.some((input) => input.name === name))
    .map((name) => ({ path: name, message: `There is no input of this name. There are: ${declared.map((input) => input.name).join(', ')}.` }))
  const inputs: Record<string, string | number> = {}
  for (const input of declared) {
    const sent = Object.hasOwn(raw, input.name) ? raw[input.name] : undefined
    const text = (typeof sent === 'number' ? plainNumber(sent) : String(sent ?? input.default ?? '')).trim()
    if (text === '' && input.default === null) continue
    const value = text.length > LONGEST ? null : valueOf(input, text)
    if (value === null) errors.push({ path: input.name, message: allowed(input) })
    else inputs[input.name] = value
  }
  return errors.length > 0 ? { ok: false, errors } : { ok: true, inputs }
}

/** A number without the digits that binary arithmetic leaves behind. */
const plainNumber = (value: number): string => String(Number(value.toPrecision(12)))

/** The number or word an input's text means, or null when it is none or out of limits. */
function valueOf(input: ShopInput, text: string): string | number | null {
  switch (input.kind) {
    case 'choice': return chosen(input, text)
    case 'part': return /^[\w][\w .·/-]*$/.test(text) ? text.toUpperCase().replace(/\s+/g, '') : null
    case 'exact': return parseExact(text) ? text : null
    case 'drill': return within(input, findDrill(text)?.inches ?? withUnit(text, lengthUnits))
    case 'length': return within(input, withUnit(text, lengthUnits))
    case 'torque': return within(input, withUnit(text, torqueUnits))
    case 'number': return within(input, withUnit(text, numberUnits[input.unit] ?? plainUnits))
  }
}

function chosen(input: ShopInput, text: string): string | null {
  const wanted = text.toLowerCase()
  return input.options?.find(({ value, aliases = [] }) => [value, ...aliases].some((name) => name.toLowerCase() === wanted))?.value ?? null
}

function withUnit(text: string, units: UnitFactors): number | null {
  const match = /^([+-]?[\d./ ½¼¾⅛⅜⅝⅞-]*[\d.½¼¾⅛⅜⅝⅞])[ -]?([^\d]{0,10})$/u.exec(text)
  const unit = (match?.[2] ?? '').trim().toLowerCase()
  const factor = Object.hasOwn(units, unit) ? units[unit] : undefined
  const value = match?.[1] === undefined ? null : parseExact(match[1])
  return value && factor ? value.mul(factor).valueOf() : null
}

function within(input: ShopInput, value: number | null): number | null {
  if (value === null || !Number.isFinite(value)) return null
  const slack = 1e-9
  return value >= (input.min ?? -Infinity) - slack && value <= (input.max ?? Infinity) + slack ? value : null
}

/** The sentence that says what an input takes. */
export function allowed(input: ShopInput): string {
  if (input.kind === 'choice') return `${input.label}: choose one of ${(input.options ?? []).map(({ value }) => value).join(', ')}.`
  if (input.kind === 'part') return `${input.label}: write a designation ${input.hint ?? example.part}.`
  const limits = input.min === undefined || input.max === undefined ? '' : ` from ${limitWords(input, input.min)} to ${limitWords(input, input.max)}`
  const word = { length: 'a length', drill: 'a drill or a diameter', torque: 'a torque', number: 'a number', exact: 'a number' }[input.kind]
  return `${input.label}: ${word}${limits}, ${example[input.kind]}.`
}

function limitWords(input: ShopInput, limit: number): string {
  const shown = Number(limit.toFixed(4))
  if (input.kind === 'torque') return `${shown} in-lb`
  return input.unit === 'in' ? `${shown} in (${Number((limit * MM_PER_INCH).toFixed(2))} mm)` : `${shown}${input.unit ? ` ${input.unit}` : ''}`
}

/** Inputs that were read, by name. Asking for a number that is a word, or the reverse, is a mistake of the program and throws. */
export class InputReader {
  constructor(private readonly inputs: ShopInputs) {}

  number(name: string): number {
    const value = this.inputs[name]
    if (typeof value !== 'number') throw new Error(`no number was read for ${name}`)
    return value
  }

  word(name: string): string {
    const value = this.inputs[name]
    if (typeof value !== 'string') throw new Error(`no word was read for ${name}`)
    return value
  }

  optionalNumber(name: string): number | undefined {
    return this.inputs[name] === undefined ? undefined : this.number(name)
  }

  optionalWord(name: string): string | undefined {
    return this.inputs[name] === undefined ? undefined : this.word(name)
  }
}
