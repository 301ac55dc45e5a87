// What the address of a results page says. Checking it is the schema's.
import type { SearchAddress } from '@/lib/paths'

/** What the address says; a key given twice counts once, blanks count as absent. */
export function readSearchAddress(given: Record<string, string | string[] | undefined>): SearchAddress {
  const one = (name: string) => { const v = given[name]; return (Array.isArray(v) ? v[0] : v) || undefined }
  // The section filter's option names its kit too, so that a form without script sends a pair that fits.
  const place = one('place')?.split('/')
  const offset = Number(one('offset') ?? 0)
  return {
    q: one('q'), kit: place?.[0] || one('kit'), section: place ? place[1] || undefined : one('section'), operation: one('operation'), kind: one('kind'),
    stamped: one('stamped') === '1' ? '1' : undefined, offset: Number.isInteger(offset) && offset > 0 ? Math.min(offset, 10_000) : undefined,
  }
}
