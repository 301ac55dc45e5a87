// The kit maker's own limits, entered by a steward: they come before the handbook's and are named. Storing them is elsewhere.
import { holdsFor, inchesOfInput } from './limit-inputs'
import { DIAMETERS, inDiameters } from './limit-quantity'
import type { ShopInputs } from './shop-input'
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
    if (!named.has(item.name)) return [item]
    const first = seen.has(item.name) ? [] : before(item.name)
    seen.add(item.name)
    return [...first, { ...item, note: [item.note, 'the kit maker’s own limit wins'].filter(Boolean).join('; ') }]
  })
  return [...mine.filter((limit) => !seen.has(limit.result)).map((limit) => makerResult(limit, table, inputs)), ...placed]
}

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
  return { name, ...quantity, source: reference, basis: 'maker', ...(note ? { note } : {}), ...(diameter === null ? {} : { how: display.inch }) }
}
