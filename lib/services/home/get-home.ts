// The first page: lately stamped, and open questions somebody could answer.
import 'server-only'
import { listLatelyStamped, listOpenQuestions } from '@/db/queries/home'
import type { AppContext } from '@/lib/context'
import type { Hit } from '@/lib/schemas/search'
import { presentHits } from '@/lib/services/search/present-hits'

export async function getHome(context: AppContext): Promise<{ stamped: Hit[]; open: Hit[] }> {
  const [stamped, open] = await Promise.all([listLatelyStamped(context.reader, 5), listOpenQuestions(context.reader, 5)])
  return {
    stamped: await presentHits(context, stamped.map((s) => ({ id: s.entryId, postId: s.postId, score: 0, terms: [] }))),
    open: await presentHits(context, open.map((id) => ({ id, postId: id, score: 0, terms: [] }))),
  }
}
