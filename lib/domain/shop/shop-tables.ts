// All shop tables by slug, in the order of the contents list.
import { bendTable } from './bend-table'
import { boltTable } from './bolt-table'
import { countersinkTable } from './countersink-table'
import { drillTable } from './drill-table'
import { grommetTable } from './grommet-table'
import { rivetTable } from './rivet-table'
import type { ShopTable } from './shop-table'
import { torqueTable } from './torque-table'
import { tubeTable } from './tube-table'
import { unitsTable } from './units-table'
import { wireTable } from './wire-table'

export const SHOP_TABLES: readonly ShopTable[] = [
  drillTable, rivetTable, countersinkTable, boltTable, torqueTable, grommetTable, bendTable, tubeTable, wireTable, unitsTable,
]

/** A table by its slug, or null. */
export function shopTable(slug: string): ShopTable | null {
  return SHOP_TABLES.find((table) => table.slug === slug) ?? null
}
