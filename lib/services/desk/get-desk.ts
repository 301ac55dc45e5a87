// The mentors' desk: the rail of tags and the one sheet that is open. A fixed number of queries, whatever hangs there.
import 'server-only'
import { getCautionedPost, listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import { countAskedFor, listDeskFacts, type DeskFilters } from '@/db/queries/desk'
import { cautionTable } from '@/lib/content/caution-table'
import type { AppContext } from '@/lib/context'
import { unionCautions, worstSignalWord } from '@/lib/domain/cautions/group-cautions'
import type { SignalWord } from '@/lib/domain/cautions/rule-table'
import { nextOnRail, orderRail, type RailFact, type RailReason, type RailTag } from '@/lib/domain/desk/order-rail'
import type { Missing } from '@/lib/domain/stamps/stamp-state'
import { refuse } from '@/lib/errors'
import type { Member } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { judge } from '@/lib/services/posts/judge-post'
import { presentCautions } from '@/lib/services/posts/present-post'
import { loadSheet, type DeskSheet } from './load-sheet'

export interface DeskTag {
  postId: number
  reason: RailReason
  missing: Missing
  needsTwo: boolean
  title: string
  /** Signal word and topic of the worst caution: a title never stands without them. */
  caution: { signalWord: SignalWord; title: string } | null
  goingBy: number
  /** Code of the primary section. */
  section: string | undefined
}
export interface Desk {
  mark: string
  /** Posts off the rail, waiting for what this mentor asked. */
  waiting: number
  tags: DeskTag[]
  /** How many hang beyond those shown; `isCut` when even these are not all. */
  more: number
  isCut: boolean
  open: DeskSheet | null
  /** The post to open after this one, or null. */
  next: number | null
}
export interface DeskQuery extends DeskFilters {
  /** The post whose sheet is open; undefined for the first on the rail, 0 for none. */
  open?: number | undefined
}

const mostTags = 40
const mostFacts = 2_000
const codes = {
  warning: cautionTable.cautions.filter((c) => c.signalWord === 'WARNING').map((c) => c.code),
  caution: cautionTable.cautions.filter((c) => c.signalWord === 'CAUTION').map((c) => c.code),
}
const words: readonly (SignalWord | null)[] = [null, 'NOTICE', 'CAUTION', 'WARNING']

/** 403 for anybody but a mentor. A post that is not to be seen any more opens nothing. */
export async function getDesk(context: AppContext, query: DeskQuery): Promise<Desk> {
  const { actor, reader } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'desk.open') || actor.mark === null) throw refuse.forbidden(whyNot['desk.open'])
  const [rows, waiting] = await Promise.all([listDeskFacts(reader, actor.id, codes, query, mostFacts), countAskedFor(reader, actor.id)])
  const rail = orderRail(rows.map(({ worst, ...row }): RailFact => ({ ...row, worstWord: words[worst] ?? null })))
  const shown = rail.slice(0, mostTags)
  const openId = query.open ?? shown[0]?.fact.postId ?? 0
  const [tags, open] = await Promise.all([presentTags(context, shown), openId === 0 ? null : openSheet({ ...context, actor }, rail, openId)])
  return { mark: actor.mark, waiting, tags, more: rail.length - shown.length, isCut: rows.length === mostFacts, open, next: nextOnRail(rail, openId) }
}

async function presentTags({ reader }: AppContext, tags: readonly RailTag[]): Promise<DeskTag[]> {
  const posts = new Map((await listCautionedPosts(reader, [...new Set(tags.flatMap(({ fact }) => [fact.postId, fact.entryId]))])).map((p) => [p.id, p]))
  return tags.flatMap(({ fact, reason }): DeskTag[] => {
    const post = posts.get(fact.postId)
    const entry = posts.get(fact.entryId)
    if (!post || !entry) return []
    const { missing } = judge(post, post.id === entry.id ? 0 : entry.current.number)
    return [{ postId: post.id, reason, missing, needsTwo: post.needsTwo, title: entry.current.title, caution: worstCaution(post, entry), goingBy: fact.goingBy, section: entry.current.sections[0] }]
  })
}

function worstCaution(post: CautionedPost, entry: CautionedPost): DeskTag['caution'] {
  const standing = unionCautions([presentCautions(post), presentCautions(entry)]).filter((c) => c.waived === undefined)
  const worst = standing.find((c) => c.signalWord === worstSignalWord(standing))
  return worst ? { signalWord: worst.signalWord, title: worst.title } : null
}

/** Also opens what does not hang (any more): a link from elsewhere, or somebody was faster. */
async function openSheet(context: AppContext & { actor: Member }, rail: readonly RailTag[], postId: number): Promise<DeskSheet | null> {
  const hanging = rail.find((t) => t.fact.postId === postId)
  if (hanging) return loadSheet(context, hanging.fact.entryId, postId)
  const found = await getCautionedPost(context.reader, postId)
  return found && found.state === 'visible' ? loadSheet(context, found.parentId ?? postId, postId) : null
}
