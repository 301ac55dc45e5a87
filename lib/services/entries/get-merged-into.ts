// Where the address of a merged entry leads.
import 'server-only'
import type { Route } from 'next'
import { findMergedInto } from '@/db/queries/entries'
import type { AppContext } from '@/lib/context'
import { paths } from '@/lib/paths'

/** Null for an entry that was not merged. */
export async function getMergedInto({ reader }: AppContext, id: number): Promise<Route | null> {
  const into = await findMergedInto(reader, id)
  return into === null ? null : paths.entry(into)
}
