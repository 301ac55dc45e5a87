// Posts as a brief shows them: a passage with its stamps, how it went and its cautions; a link; the sizes a post uses that a shop table agrees with.
import 'server-only'
import type { CautionedPost } from '@/db/queries/cautioned-post'
import { passageOf } from '@/lib/domain/briefs/passage-of'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { wholeText } from '@/lib/domain/entries/entry-text'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'
import type { BriefItem, BriefSize, PostLink } from '@/lib/schemas/brief'
import type { Caution } from '@/lib/schemas/post'
import { checkPostNumbers } from '@/lib/services/posts/check-post-numbers'
import { judge } from '@/lib/services/posts/judge-post'
import { presentCautions, presentChanges, presentOutcomes, presentStamps } from '@/lib/services/posts/present-post'

/** A visible post with the question it answers; its title and cautions are of both. */
export interface BriefPost { found: CautionedPost; question: CautionedPost | null }

const standing = (list: readonly Caution[]) => list.filter((c) => c.waived === undefined)

/** Cautions that stand, of a post and of the question over it. */
export function cautionsOf({ found, question }: BriefPost): Caution[] {
  return unionCautions([standing(presentCautions(found)), question ? standing(presentCautions(question)) : []])
}

export function presentLink(post: BriefPost): PostLink {
  const { found, question } = post
  return { postId: found.id, title: (question ?? found).current.title, url: paths.entry((question ?? found).id, found.id), cautions: cautionsOf(post) }
}

export function presentItem(post: BriefPost): BriefItem {
  const { found, question } = post
  const { state, missing, changes } = judge(found, question?.current.number ?? 0)
  const { id, name } = found.author
  return {
    ...presentLink(post), kind: found.kind, passage: passageOf(plainOf(found), found.current.parts), author: id === null ? { name } : { id, name }, revision: revisionLetter(found.current.number),
    stamp: state, missing, needsTwo: found.needsTwo, stamps: presentStamps(found, question?.current.number ?? 0).filter((s) => s.withdrawn === undefined), outcomes: presentOutcomes(found), planChanges: presentChanges(changes),
  }
}

export const plainOf = (found: CautionedPost) => found.plain ?? wholeText(found.kind, found.current.parts, found.current.body)

/** Sizes that these posts advise and a table agrees with: one a table and value, with every post that uses it. */
export function presentSizes(posts: readonly BriefPost[], limits: readonly MakerLimit[]): BriefSize[] {
  const sizes = new Map<string, BriefSize>()
  for (const post of posts) {
    for (const { claim, expected, table, role, verdict, source, basis, makerLimit } of checkPostNumbers(post.found, post.question, limits)) {
      const named = table === undefined ? null : shopTable(table)
      // What the maker's own limit forbids is no size to go by, whatever a handbook says.
      if (makerLimit !== undefined || role !== 'advised' || verdict !== 'agrees' || expected === undefined || !named || basis === undefined) continue
      const key = `${named.slug}\n${expected}`
      const known = sizes.get(key) ?? { claim, expected, table: named.slug, tableTitle: named.title, url: paths.shopTable(named.slug), source: source ?? null, basis, posts: [], cautions: [] }
      if (!known.posts.some((link) => link.postId === post.found.id)) known.posts.push(presentLink(post))
      sizes.set(key, { ...known, cautions: unionCautions([known.cautions, cautionsOf(post)]) })
    }
  }
  return [...sizes.values()]
}
