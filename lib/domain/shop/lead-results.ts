// Which results an answer leads with: the number one came for, from each source that gives it.
import type { ShopResult } from './shop-table'

/** Names in order of preference, where the first result of the table is not what one came for. */
const leads: Readonly<Record<string, readonly string[]>> = {
  drills: ['screw-drill', 'drill', 'nearest'],
  bend: ['flat-length'],
  grommet: ['hole-groove', 'for-hole', 'hole'],
  units: ['mm', 'in', 'N·m', 'lbf-in'],
}

/** There only when it was asked for, and then it leads even without a value: any other number would answer another question. */
const ASKED = 'for-hole'

const leadsOn = ({ name, value }: ShopResult): boolean => name === ASKED || Object.keys(value).length > 0

/** All results of the leading name: the kit maker's and each source's own. Empty only for no results at all. */
export function leadResults<R extends ShopResult>(table: string, results: readonly R[]): R[] {
  const preferred = (Object.hasOwn(leads, table) ? leads[table] : undefined) ?? []
  const name = preferred.find((name) => results.some((result) => result.name === name && leadsOn(result))) ?? results[0]?.name
  return results.filter((result) => result.name === name)
}
