// What waits for the member who asks, the newest first.
import 'server-only'
import { listOpenNotices } from '@/db/queries/notices'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { NoticeList } from '@/lib/schemas/notices'
import { presentNotices } from './present-notices'

/** Open ones only; 401 for a visitor. */
export async function listNotices(context: AppContext, { limit, cursor }: { limit: number; cursor?: number | undefined }): Promise<NoticeList> {
  if (!context.actor) throw refuse.signIn()
  const rows = await listOpenNotices(context.reader, context.actor.id, { limit: limit + 1, before: cursor })
  const shown = rows.slice(0, limit)
  return { items: await presentNotices(context, shown), nextCursor: rows.length > limit ? String(shown.at(-1)?.notice.id ?? '') : null }
}
