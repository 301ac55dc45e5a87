// The kits of this installation.
import 'server-only'
import { listKits as listKitRows } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import type { KitList } from '@/lib/schemas/kits'

/** In the order they were set up. */
export async function listKits(context: AppContext): Promise<KitList> {
  return { items: (await listKitRows(context.reader)).map(({ slug, name, maker }) => ({ slug, name, maker })) }
}
