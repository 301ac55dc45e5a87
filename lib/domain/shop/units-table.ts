// The units table: one value in every unit of its kind, from exact factors.
import data from '@/content/shop/units.json'
import type Fraction from 'fraction.js'
import { cite } from './citation'
import { fractionOfInch, parseExact } from './exact-fraction'
import { result } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'
import { convertExact, kindOfUnit, roundedSource, UNIT_KINDS } from './unit-conversion'

const ALIASES: Record<string, string[]> = {
  in: ['inch', 'inches', '"'], 'lbf-in': ['in-lb', 'in-lbs'], 'lbf-ft': ['ft-lb', 'ft-lbs'], 'N·m': ['Nm', 'N-m'], 'US gal': ['gal'], '°F': ['F', 'degF'], '°C': ['C', 'degC'], 'mm²': ['mm2'], kt: ['kts', 'knots'], lb: ['lbs'],
}
const allUnits = UNIT_KINDS.flatMap(({ units }) => units)
const options = allUnits.map((unit) => ({ value: unit, label: unit, ...(ALIASES[unit] ? { aliases: ALIASES[unit] } : {}) }))
const LARGEST = 1e9

export const unitsTable = defineTable({
  slug: 'units',
  title: 'Units',
  inputs: [
    { name: 'value', label: 'Value', unit: '', kind: 'exact', default: '1' },
    { name: 'from', label: 'Unit', unit: '', kind: 'choice', options, default: 'in' },
    { name: 'to', label: 'Into', unit: '', kind: 'choice', options, default: null, hint: 'left out: every unit of the kind' },
  ],
  results: allUnits.map((unit) => ({ name: unit, label: unit, unit })),
  cautions: [],
  check(given) {
    const [from, to, value] = [given.word('from'), given.optionalWord('to'), exactOf(given.word('value')).valueOf()]
    if (Math.abs(value) > LARGEST) return [{ path: 'value', message: 'Value: a number up to 1000000000, such as 3/16 or 12.5.' }]
    if (to !== undefined && kindOfUnit(to) !== kindOfUnit(from)) return [{ path: 'to', message: `Into: ${from} is a ${kindOfUnit(from) ?? ''}; choose one of ${siblings(from).join(', ')}.` }]
    const kelvin = kindOfUnit(from) === 'temperature' ? convertExact(exactOf(given.word('value')), from, 'K') : null
    if (kelvin && kelvin.valueOf() < 0) return [{ path: 'value', message: 'Value: no temperature is below -459.67 °F, -273.15 °C.' }]
    if (value < 0 && kindOfUnit(from) !== 'temperature') return [{ path: 'value', message: 'Value: 0 or more, such as 3/16 or 12.5.' }]
    return []
  },
  work(given) {
    const from = given.word('from')
    const wanted = given.optionalWord('to')
    return (wanted ? [wanted] : siblings(from)).map((to) => converted(given.word('value'), from, to))
  },
})

/** A length in inches, or null where the unit measures something else, and for lengths that no drawing shows. */
export function unitLength(value: string, from: string): number | null {
  const inches = convertExact(exactOf(value), from, 'in')?.valueOf()
  return inches !== undefined && inches >= 1 / 128 && inches <= 1200 ? inches : null
}

/** What was read as an exact number already; anything else would be a mistake of the program. */
function exactOf(text: string): Fraction {
  const value = parseExact(text)
  if (!value) throw new Error(`not a number: ${text}`)
  return value
}

function siblings(unit: string): readonly string[] {
  return UNIT_KINDS.find(({ units }) => units.includes(unit))?.units.filter((other) => other !== unit) ?? []
}

function converted(text: string, from: string, to: string): ShopResult {
  const number = convertExact(exactOf(text), from, to)?.valueOf() ?? NaN
  const shown = `${Number(number.toPrecision(10))} ${to}`
  const label = to === 'in' ? fractionOfInch(number) : null
  return result(to, { value: { number, ...(label ? { label } : {}) }, unit: to, display: { inch: shown, metric: shown } }, cite(roundedSource(from) ?? roundedSource(to) ?? data.cite), { how: `${text} ${from}` })
}
