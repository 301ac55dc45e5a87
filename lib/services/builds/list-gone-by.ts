// What a builder goes by, on a kit or a section: with its cautions, and with what became of it since.
import 'server-only'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { listGoneBy as listRows } from '@/db/queries/builds'
import type { AppContext } from '@/lib/context'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { paths } from '@/lib/paths'
import type { GoneBy } from '@/lib/schemas/builds'
import { judge } from '@/lib/services/posts/judge-post'
import { presentCautions } from '@/lib/services/posts/present-post'

/** Newest mark first. Withdrawn advice stays and says so; what is hidden or merged is left out like everywhere. */
export async function listGoneBy({ reader }: Pick<AppContext, 'reader'>, memberId: number, place: { kitId: number } | { sectionId: number }): Promise<GoneBy[]> {
  const rows = await listRows(reader, memberId, place)
  const posts = new Map((await listCautionedPosts(reader, [...new Set(rows.flatMap((r) => [r.postId, r.parentId ?? r.postId]))], 'plain')).map((p) => [p.id, p]))
  return rows.flatMap((row): GoneBy[] => {
    const [found, entry] = [posts.get(row.postId), posts.get(row.parentId ?? row.postId)]
    if (!found || !entry || found.kind === 'question') return []
    const [state, ofEntry] = [found.state, entry.state]
    if ((state !== 'visible' && state !== 'withdrawn') || (ofEntry !== 'visible' && ofEntry !== 'withdrawn')) return []
    return [{
      postId: found.id, url: paths.entry(entry.id, found.id), kind: found.kind, title: entry.current.title, author: found.author.name, sections: entry.current.sections,
      revision: revisionLetter(row.revision), currentRevision: revisionLetter(found.current.number), state: ofEntry === 'withdrawn' ? 'withdrawn' : state, stamp: found.stampState,
      plansChanged: judge(found, found.kind === 'answer' ? entry.current.number : 0).changes.length > 0,
      cautions: unionCautions([presentCautions(entry), presentCautions(found)]),
    }]
  })
}
