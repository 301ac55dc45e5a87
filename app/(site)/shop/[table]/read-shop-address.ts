// What the address of a shop table says: its inputs as text, and which units stand first.
import { linkInputs } from '@/lib/domain/shop/input-words'
import type { ShopTable } from '@/lib/domain/shop/shop-table'
import type { FirstSystem } from '@/lib/format/shop-words'

export interface ShopAddress {
  /** As sent, for the table to read; a key given twice counts once. */
  raw: Record<string, string>
  /** What the fields show: as sent, else what the table assumes. */
  values: Record<string, string>
  first: FirstSystem
  /** The address's own word on units, or undefined. */
  units: FirstSystem | undefined
  /** Slug of the kit whose maker's limits are asked for. */
  kit: string | undefined
}

/** `units` and `kit` are no inputs of any table; `preferred` stands first when the address says nothing. */
export function readShopAddress(table: Pick<ShopTable, 'title' | 'inputs'>, query: Readonly<Record<string, string | string[] | undefined>>, preferred: FirstSystem): ShopAddress {
  const given = Object.entries(query).flatMap(([name, value]): [string, string][] => {
    const one = Array.isArray(value) ? value[0] : value
    return one === undefined ? [] : [[name, one]]
  })
  const asked = given.find(([name]) => name === 'units')?.[1]
  const units = asked === 'metric' || asked === 'inch' ? asked : undefined
  const kit = given.find(([name]) => name === 'kit')?.[1] || undefined
  const raw = Object.fromEntries(given.filter(([name]) => name !== 'units' && name !== 'kit'))
  const values = { ...Object.fromEntries(table.inputs.map(({ name }) => [name, ''])), ...linkInputs(table, raw) }
  return { raw, values, first: units ?? preferred, units, kit }
}
