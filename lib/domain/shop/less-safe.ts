// Whether a kit maker's limit allows more than every handbook does, in words for the steward who enters it: it may be a slip of the page.
import { lowerFirst } from './input-words'
import { holdsFor } from './limit-inputs'
import { DIAMETERS, inDiameters } from './limit-quantity'
import { allowedBy, limitSense } from './limit-sense'
import { diameterOf, type MakerLimit } from './maker-limits'
import type { ShopInput, ShopInputs } from './shop-input'
import type { ShopResult, ShopTable, ShopValue } from './shop-table'

/** More combinations of choices than any table has; beyond it the limit is not looked at in every one. */
const mostCases = 600
const sizesLookedAt = 12

type Entered = Pick<MakerLimit, 'result' | 'inputs' | 'value' | 'unit' | 'display'>

/**
 * "At least 2 D is less than the handbook's 5/16 in (…): is the page right?", for the first of the cases the limit holds for in which no
 * source allows as much. Null where it is as safe, or where nothing can be compared: words, results that are no limit, no handbook value.
 */
export function lessSafe(table: ShopTable, limit: Entered): string | null {
  const sense = limitSense(table.slug, limit.result)
  if (!sense) return null
  for (const raw of [...casesOf(table.inputs, limit.inputs), ...sizesOf(table.inputs, limit.inputs)]) {
    const outcome = table.compute(raw)
    if (!outcome.ok || !holdsFor(table, limit.inputs, outcome.inputs)) continue
    const mine = allowedBy(valueFor(limit, table, outcome.inputs), sense)
    const sources = outcome.results.filter(({ name }) => name === limit.result).flatMap((result) => {
      const allowed = allowedBy(result.value, sense)
      return allowed ? [{ result, ...allowed }] : []
    })
    if (!mine || sources.length === 0) continue
    const isLess = sense !== 'most' && sources.every(({ low }) => mine.low < low - 1e-6)
    const isMore = sense !== 'least' && sources.every(({ high }) => mine.high > high + 1e-6)
    const [source] = sources
    if (source && (isLess || isMore)) return sentence(limit, source.result, isLess ? 'less' : 'more', caseWords(table.inputs, limit.inputs, raw))
  }
  return null
}

function valueFor({ value, unit }: Entered, table: ShopTable, inputs: ShopInputs): ShopValue {
  const diameter = unit === DIAMETERS ? diameterOf(table, inputs) : null
  return diameter === null ? value : inDiameters(value, diameter).value
}

/** The limit's inputs with every choice of the others: what holds for all has to be safe for all. */
function casesOf(declared: readonly ShopInput[], named: Readonly<Record<string, string>>): Record<string, string>[] {
  const open = declared.filter(({ name, kind, default: standing }) => kind === 'choice' && standing !== null && !Object.hasOwn(named, name))
  return open.reduce<Record<string, string>[]>((cases, { name, options = [] }) =>
    (cases.length * options.length > mostCases ? cases : cases.flatMap((each) => options.map(({ value }) => ({ ...each, [name]: value })))), [{ ...named }])
}

/** Sizes from the least to the most of every one the limit leaves open: a radius that is right for thin sheet may be wrong for thick. */
function sizesOf(declared: readonly ShopInput[], named: Readonly<Record<string, string>>): Record<string, string>[] {
  return declared.filter(({ name, kind, max }) => kind !== 'choice' && max !== undefined && !Object.hasOwn(named, name))
    .flatMap(({ name, min, max = 0 }) => between(min === undefined || min <= 0 ? max / 1000 : min, max).map((size) => ({ ...named, [name]: size.toFixed(4) })))
}

/** Each as many times the one before, because the tables are finer where sizes are small. Ends may lie beyond what a handbook lists. */
const between = (least: number, most: number): number[] => Array.from({ length: sizesLookedAt }, (_, i) => least * (most / least) ** (i / (sizesLookedAt - 1)))

/** What the limit names, and the choices that are not what the form assumes: the rest doesn't tell one case from another. */
const caseWords = (declared: readonly ShopInput[], named: Readonly<Record<string, string>>, raw: Readonly<Record<string, string>>): string => declared.flatMap(({ name, label, options, default: standing }) => {
  const text = raw[name]
  return text === undefined || (text === standing && !Object.hasOwn(named, name)) ? [] : [`${lowerFirst(label)} ${options?.find(({ value }) => value === text)?.label ?? text}`]
}).join(', ')

function sentence({ display }: Entered, handbook: ShopResult, word: 'less' | 'more', where: string): string {
  const [mine, source] = [display.inch, handbook.source]
  const how = handbook.how && /^\d[\d.]* [Dt]$/.test(handbook.how) ? ` (${handbook.how})` : ''
  return `${mine.charAt(0).toUpperCase()}${mine.slice(1)} allows ${word} than the handbook’s ${handbook.display.inch}${how}${where ? `, for ${where}` : ''}${source ? ` (${source.title}, ${source.section})` : ''}. Is the page right?`
}
