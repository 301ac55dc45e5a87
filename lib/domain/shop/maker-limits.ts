// The kit maker's own limits, entered by a steward: they come before the handbook's and are named. Storing them is elsewhere.
import { holdsFor, inchesOfInput } from './limit-inputs'
import { DIAMETERS, inDiameters } from './limit-quantity'
import { allowedBy, limitSense } from './limit-sense'
import type { ShopInputs } from './shop-input'
import { length } from './shop-result'
import type { ShopResult, ShopTable, ShopValue } from './shop-table'

export interface MakerLimit {
  /** The result it stands for: table slug and result name. */
  table: string
  result: string
  /** Inputs for which it holds, as the table takes them: `{ thread: '10-32' }`. `{}` = for all. */
  inputs: Readonly<Record<string, string>>
  value: ShopValue
  /** The result's unit, or 'D': diameters of the fastener. */
  unit: string
  display: { inch: string; metric: string }
  /** Bulletin or page, with its date. */
  reference: { title: string; section: string; year: string }
  note?: string
}

type Asked = Pick<ShopTable, 'slug' | 'inputs'>

/**
 * Puts the maker's limits that hold for `inputs` (as the table read them) in front of the handbook results of the same name, which
 * stay listed and say that they don't win.
 */
export function withMakerLimits(table: Asked, inputs: ShopInputs, results: readonly ShopResult[], limits: readonly MakerLimit[]): ShopResult[] {
  const mine = limits.filter((limit) => limit.table === table.slug && holdsFor(table, limit.inputs, inputs))
  const named = new Set(mine.map((limit) => limit.result))
  const before = (name: string): ShopResult[] => mine.filter((limit) => limit.result === name).map((limit) => makerResult(limit, table, inputs))
  const seen = new Set<string>()
  const placed = results.flatMap((item) => {
    if (!named.has(item.name)) return [isWorkedFrom(table.slug, named, item.name, inputs) ? withNote(item, 'worked out from the handbook’s value, not from the kit maker’s limit') : item]
    const first = seen.has(item.name) ? [] : before(item.name)
    seen.add(item.name)
    return [...first, withNote(item, 'the kit maker’s own limit wins')]
  })
  return [...mine.filter((limit) => !seen.has(limit.result)).map((limit) => makerResult(limit, table, inputs)), ...placed]
}

/** Results that a table works out from another of its results: by result, what they are worked out from. */
const workedFrom: Readonly<Record<string, Readonly<Record<string, readonly string[]>>>> = {
  rivet: { 'edge-rim': ['edge-centre', 'hole'] }, torque: Object.fromEntries(['with-drag', 'castle-start', 'castle-limit', 'wrench'].map((name) => [name, ['torque']])), bend: { 'radius-times': ['radius-least'] },
  grommet: Object.fromEntries(['drill', 'drill-below', 'drill-above', 'step-drill'].map((name) => [name, ['hole', 'hole-groove']])),
}
/** The wrench is set to the reader's own target where one is given. */
const isWorkedFrom = (table: string, limited: ReadonlySet<string>, result: string, inputs: ShopInputs): boolean =>
  !(result === 'wrench' && inputs['target'] !== undefined) && (workedFrom[table]?.[result] ?? []).some((name) => limited.has(name))

const withNote = (result: ShopResult, note: string): ShopResult => ({ ...result, note: [result.note, note].filter(Boolean).join('; ') })

/** The fastener's diameter in inches among a table's inputs, or null where it has none. */
export function diameterOf({ inputs: declared }: Pick<ShopTable, 'inputs'>, inputs: ShopInputs): number | null {
  const input = declared.find(({ name, unit }) => name === 'diameter' && unit === 'in')
  const present = input ? inputs[input.name] : undefined
  if (!input || present === undefined) return null
  return typeof present === 'number' ? present : inchesOfInput(input, present)
}

function makerResult({ result: name, value, unit, display, reference, note }: MakerLimit, table: Asked, inputs: ShopInputs): ShopResult {
  const diameter = unit === DIAMETERS ? diameterOf(table, inputs) : null
  const quantity = diameter === null ? { value, unit, display } : inDiameters(value, diameter)
  const against = againstWords(table.slug, name, quantity.value, inputs)
  const said = [note, against].filter(Boolean).join('; ')
  return { name, ...quantity, source: reference, basis: 'maker', ...(said ? { note: said } : {}), ...(diameter === null ? {} : { how: display.inch }), ...(against ? { against } : {}) }
}

/** The input in which a reader gives what they have measured of a result, in inches. */
const measuredIn: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  rivet: { 'edge-centre': 'edge', 'pitch-least': 'pitch' }, bend: { 'radius-least': 'radius' }, wire: { clearance: 'clearance', support: 'spacing' },
}

/** In what the reader's own measure doesn't meet the maker's limit: it may meet the handbook's. '' where it does, or where none was given. */
function againstWords(table: string, result: string, value: ShopValue, inputs: ShopInputs): string {
  const given = inputs[measuredIn[table]?.[result] ?? '']
  const allowed = allowedBy(value, limitSense(table, result))
  if (typeof given !== 'number' || !allowed) return ''
  if (given < allowed.low - 1e-6) return `short by ${length(allowed.low - given).display.inch} of the kit maker’s least`
  return given > allowed.high + 1e-6 ? `over the kit maker’s most by ${length(given - allowed.high).display.inch}` : ''
}
