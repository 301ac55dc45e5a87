// The kits one can choose at a shop table: those whose makers' limits were entered.
import 'server-only'
import { listKitsWithLimits } from '@/db/queries/kit-limits'
import type { AppContext } from '@/lib/context'

export interface LimitKit { slug: string; name: string; maker: string }

/** With the one that was chosen, also where it has none. */
export async function listLimitKits(context: AppContext, chosen?: string): Promise<LimitKit[]> {
  return listKitsWithLimits(context.reader, chosen)
}
