// Every revision of a post, and the differences between two of them.
import 'server-only'
import { getCautionedHistory, getCautionedPost, type CautionedPost } from '@/db/queries/cautioned-post'
import type { AppContext } from '@/lib/context'
import { compareRevisions, type FieldChange } from '@/lib/domain/entries/compare-revisions'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionLetter, revisionNumber } from '@/lib/domain/entries/revision-letter'
import type { StampState } from '@/lib/domain/stamps/stamp-state'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import type { Caution, Stamp } from '@/lib/schemas/post'
import { judge } from '@/lib/services/posts/judge-post'
import { subjectOf } from '@/lib/services/posts/load-entry'
import { presentCautions, presentStamps } from '@/lib/services/posts/present-post'
import { renderText } from '@/lib/services/posts/render-text'

type Revision = CautionedPost['current']
export interface RevisionPage {
  postId: number
  entryId: number
  title: string
  kind: CautionedPost['kind']
  state: CautionedPost['state']
  stampState: StampState
  cautions: Caution[]
  revisions: { letter: string; author: string; createdAt: number; stamps: Stamp[] }[]
  from: string
  to: string
  changes: FieldChange[]
  /** The whole text of the older of the two, as it read. */
  html: string
}

/** The page for two letters; without them the last two. 404 for a post or a letter that is not there. */
export async function getRevisions(context: AppContext, postId: number, letters: { from?: string | undefined; to?: string | undefined }): Promise<RevisionPage> {
  const known = await getCautionedHistory(context.reader, postId)
  if (!known || !can(context.actor, 'post.read', subjectOf(known.found))) throw refuse.notFound('This post')
  const { found, history } = known
  const question = found.parentId === null ? null : await getCautionedPost(context.reader, found.parentId)
  if (question && !can(context.actor, 'post.read', subjectOf(question))) throw refuse.notFound('This post')
  const last = found.current.number
  const to = numberOf(letters.to, last)
  const from = numberOf(letters.from, Math.max(1, to - 1))
  const [older, newer] = [history[from - 1], history[to - 1]]
  if (!older || !newer) throw refuse.notFound('This revision')
  const stamps = presentStamps(found, question?.current.number ?? 0)
  const rendered = await renderText(context.renderer, textFields(found.kind, older.parts, older.body))
  return {
    postId, entryId: found.parentId ?? postId, title: question?.current.title ?? found.current.title, kind: found.kind, state: found.state, stampState: judge(found, question?.current.number ?? 0).state, cautions: presentCautions(found),
    revisions: history.map((r) => ({ letter: revisionLetter(r.number), author: found.revisions.find((x) => x.number === r.number)?.author.name ?? '', createdAt: r.createdAt, stamps: stamps.filter((s) => s.revision === revisionLetter(r.number)) })),
    from: revisionLetter(from), to: revisionLetter(to), changes: from === to ? [] : compareRevisions(comparable(found.kind, older), comparable(found.kind, newer)),
    html: textFields(found.kind, older.parts, older.body).map((f) => `${f.label ? `<h3>${f.label}</h3>` : ''}${rendered.html[f.name] ?? ''}`).join('\n'),
  }
}

function numberOf(letter: string | undefined, fallback: number): number {
  if (letter === undefined) return fallback
  const number = revisionNumber(letter)
  if (number === null) throw refuse.notFound('This revision')
  return number
}

/** Everything that was judged, as labelled text. */
function comparable(kind: CautionedPost['kind'], r: Revision): [string, string][] {
  return [
    ['Title', r.title], ['Sections', r.sections.join(', ')], ['Tasks', r.tasks.join(', ')], ['Hardware', r.hardware.join(', ')],
    ['Plans', r.plans.map((p) => [p.page, p.step ? `step ${p.step}` : '', p.revision ? `Rev ${p.revision}` : ''].filter(Boolean).join(' ')).join(', ')],
    ['Order advice', r.orderAdvice.map((o) => `${o.before} before ${o.after}`).join(', ')],
    ...textFields(kind, r.parts, r.body).map((f): [string, string] => [f.label || 'Text', f.text]),
    ...(typeof r.parts?.['hours'] === 'number' ? [['Hours', String(r.parts['hours'])] as [string, string]] : []),
  ]
}
