// Everything the page of an entry shows: the entry, HTML by part, what this reader may do, their own marks, and other cases.
import 'server-only'
import { getKit, listTasksBySlug } from '@/db/queries/kits'
import { listOwnMarks } from '@/db/queries/marks'
import type { AppContext } from '@/lib/context'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { topicsOfSystem } from '@/lib/domain/cautions/critical-systems'
import type { NumbersCheck } from '@/lib/domain/numbers-check/numbers-check'
import { jascTitle } from '@/lib/content/jasc'
import { can, type PostSubject } from '@/lib/policy/can'
import { SearchLoadingError } from '@/lib/search/messages'
import { listOpenRequests } from '@/db/queries/desk'
import type { AskFor } from '@/lib/schemas/acts'
import type { Answer, Entry } from '@/lib/schemas/post'
import type { Hit } from '@/lib/schemas/search'
import { loadEntryWithPosts, subjectOf } from '@/lib/services/posts/load-entry'
import { checkPostNumbers } from '@/lib/services/posts/check-post-numbers'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { findOtherCases } from '@/lib/services/search/find-similar'

/** What this reader may do with one post, and what they have marked on it. */
export interface PostRights {
  edit: boolean; remark: boolean; stamp: boolean; tell: boolean; goBy: boolean; cautions: boolean; hide: boolean
  ownStampId: number | null
  told: { result: 'as-written' | 'with-change' | 'did-not-work'; note: string; revision: string } | null
  goesBy: string | null
  stateReason: string | null
  /** Who reads, 0 for a visitor: drafts are kept by member. */
  memberId: number
  /** What mentors wait for before they stamp it. */
  askedFor: AskFor['what'][]
  /** Its numbers against the shop tables. */
  checks: NumbersCheck[]
}
export interface EntryPage {
  entry: Entry
  parts: { name: string; label: string; html: string }[]
  kit: { slug: string; name: string; maker: string }
  sections: { code: string; title: string }[]
  tasks: { slug: string; title: string }[]
  system: { code: string; title: string; critical: boolean }[]
  rights: ReadonlyMap<number, PostRights>
  maySay: boolean
  memberId: number
  otherCases: Hit[]
  /** Titles of the tasks that order advice names. */
  adviceTitles: ReadonlyMap<string, string>
}

/** 404 as for the entry itself. Other cases are left out while search loads. */
export async function getEntryPage(context: AppContext, id: number): Promise<EntryPage> {
  const { entry, posts } = await loadEntryWithPosts(context, id)
  const ids = [entry.id, ...entry.answers.map((a) => a.id)]
  const [kit, tasks, limits, otherCases] = await Promise.all([
    getKit(context.reader, entry.kit), listTasksBySlug(context.reader, [...entry.tasks, ...entry.orderAdvice.flatMap((o) => [o.before, o.after])]), loadMakerLimits(context.reader, entry.kit), otherCasesOf(context, entry),
  ])
  const requests = await listOpenRequests(context.reader, ids)
  const own = context.actor ? await listOwnMarks(context.reader, context.actor.id, ids) : { outcomes: [], reliances: [] }
  const [found] = posts
  const rights = new Map(posts.map((p) => [p.id, { checks: checkPostNumbers(p, p.parentId === null ? null : (found ?? null), limits), ...rightsOn(context, subjectOf(p), [entry, ...entry.answers].find((x) => x.id === p.id), p.stateReason, own, requests.filter((r) => r.postId === p.id).map((r) => r.what)) }]))
  const sections = entry.sections.flatMap((code) => kit?.sections.find((s) => s.code === code) ?? [])
  return {
    entry, kit: { slug: entry.kit, name: kit?.name ?? '', maker: kit?.maker ?? '' }, sections, tasks: entry.tasks.map((slug) => ({ slug, title: tasks.find((t) => t.slug === slug)?.title ?? slug })),
    parts: found ? textFields(found.kind, found.current.parts, found.current.body).map((f) => ({ name: f.name, label: f.label, html: found.rendering?.html[f.name] ?? '' })) : [],
    system: [...new Set(sections.flatMap((s) => s.jasc ?? []))].map((code) => ({ code, title: jascTitle(code), critical: topicsOfSystem(code).length > 0 })),
    adviceTitles: new Map(tasks.map((t) => [t.slug, t.title])), rights, memberId: context.actor?.id ?? 0, maySay: entry.kind === 'question' && entry.state === 'visible' && can(context.actor, 'post.write'), otherCases,
  }
}

function rightsOn(context: AppContext, subject: PostSubject, post: Entry | Answer | undefined, stateReason: string | null, own: Awaited<ReturnType<typeof listOwnMarks>>, requests: AskFor['what'][]): Omit<PostRights, 'checks'> {
  const { actor } = context
  const told = own.outcomes.find((o) => o.postId === post?.id)
  const goesBy = own.reliances.find((r) => r.postId === post?.id)
  return {
    edit: can(actor, 'post.edit', subject), remark: can(actor, 'post.remark', subject), stamp: can(actor, 'post.stamp', subject),
    tell: can(actor, 'post.tell-how-it-went', subject), goBy: can(actor, 'post.go-by', subject), cautions: can(actor, 'post.set-cautions', subject), hide: can(actor, 'post.hide', subject),
    ownStampId: post?.stamps.find((s) => s.live && !s.withdrawn && s.mentor.id === actor?.id)?.id ?? null,
    told: told ? { result: told.result, note: told.note, revision: revisionLetter(told.revision) } : null,
    goesBy: goesBy ? revisionLetter(goesBy.revision) : null, stateReason, memberId: actor?.id ?? 0, askedFor: requests,
  }
}

async function otherCasesOf(context: AppContext, entry: Entry): Promise<Hit[]> {
  try {
    return await findOtherCases(context, entry)
  } catch (error) {
    if (error instanceof SearchLoadingError) return []
    throw error
  }
}
