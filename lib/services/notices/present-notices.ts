// Rows of notices -> what a member is shown: the post by its title with its cautions, and the bulletin behind it.
import 'server-only'
import { listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import type { NoticeRow } from '@/db/queries/notices'
import type { AppContext } from '@/lib/context'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { plansChanges } from '@/lib/domain/stamps/stamp-state'
import { paths } from '@/lib/paths'
import { can } from '@/lib/policy/can'
import type { Notice } from '@/lib/schemas/notices'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { presentCautions, presentChanges } from '@/lib/services/posts/present-post'

/** In the order given; a notice of a post that its member may not see any more shows a plain title and no text. */
export async function presentNotices(context: AppContext, rows: readonly NoticeRow[]): Promise<Notice[]> {
  const posts = await byId(context, rows.flatMap((r) => r.notice.postId ?? []))
  const entries = await byId(context, [...posts.values()].flatMap((p) => p.parentId ?? []))
  return rows.flatMap((row): Notice[] => {
    const post = row.notice.postId === null ? undefined : posts.get(row.notice.postId)
    const entry = post?.parentId == null ? post : entries.get(post.parentId)
    return post && entry ? [presentNotice(context, row, post, entry)] : []
  })
}

const byId = async (context: AppContext, ids: readonly number[]) => new Map((await listCautionedPosts(context.reader, [...new Set(ids)], 'plain')).map((p) => [p.id, p]))

function presentNotice(context: AppContext, { notice, bulletin, kit }: NoticeRow, post: CautionedPost, entry: CautionedPost): Notice {
  const isSeen = [post, entry].every((p) => can(context.actor, 'post.read', subjectOf(p)))
  const places = bulletin ? plansChanges({
    currentRevision: post.current.number, questionRevision: post.question?.currentRevision ?? 0, plans: post.plans, stamps: post.stamps, bulletins: post.bulletins.filter((b) => b.id === bulletin.id),
  }) : []
  return {
    id: notice.id, kind: notice.kind, createdAt: new Date(notice.createdAt).toISOString(), ...(notice.closedAt !== null ? { closedAt: new Date(notice.closedAt).toISOString() } : {}),
    post: { id: post.id, title: isSeen ? entry.current.title : 'A post that was taken out of view', url: paths.entry(entry.id, post.id), cautions: isSeen ? unionCautions([presentCautions(entry), presentCautions(post)]) : [] },
    ...(bulletin && kit ? { bulletin: { number: bulletin.number, issuedOn: bulletin.issuedOn, serials: bulletin.serials, summary: bulletin.summary, kit: kit.slug, places: presentChanges(places) } } : {}),
  }
}
