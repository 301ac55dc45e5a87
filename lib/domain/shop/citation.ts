// Sources of the facts in content/shop, by key: content/shop/sources.json with title, section, year and basis.
import sources from '@/content/shop/sources.json'
import { BASES, type Basis, type Source } from './shop-table'

/** What must stand beside a number that was recalled and not looked up. */
export const MEMORY_NOTE = 'from memory, not checked against the standard'
/** What must stand under a computed hole. */
export const HOLE_NOTE = 'only where the plans show one; measure the part in hand'
export const NO_SOURCE_NOTE = 'common practice, no source'

export interface Citation {
  source: Source | null
  basis: Basis
  notes: readonly string[]
}

const byKey = new Map(Object.entries<{ title: string; section: string; year: string; basis: string; note?: string }>(sources))

/**
 * The source of a fact. `worked`: the number is arithmetic on a rule that was seen, not a printed figure; what is from memory stays so.
 * Throws on an unknown key: the facts are part of the program.
 */
export function cite(key: string, worked?: 'worked'): Citation {
  const entry = byKey.get(key)
  const basis = BASES.find((known) => known === entry?.basis)
  if (!entry || !basis) throw new Error(`no such source: ${key}`)
  const { title, section, year, note } = entry
  const notes = [...(basis === 'memory' ? [MEMORY_NOTE] : []), ...(note ? [note] : [])]
  return { source: { title, section, year }, basis: worked && basis === 'seen' ? 'arithmetic' : basis, notes }
}

/** Shop custom without a published source. */
export const COMMON_PRACTICE: Citation = { source: null, basis: 'common-practice', notes: [NO_SOURCE_NOTE] }
/** Plain arithmetic on what was entered. */
export const ARITHMETIC: Citation = { source: null, basis: 'arithmetic', notes: [] }
