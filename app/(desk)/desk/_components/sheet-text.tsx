// The whole text of an open sheet: what was found at the left, the advice at the right, each under its own caution lines, with how it
// went and every remark. Nothing is folded away: a stamp judges all of it.
import { CautionLine } from '@/components/cautions/caution-line'
import { HowItWent } from '@/components/entries/how-it-went'
import { PlanChanges } from '@/components/entries/plan-changes'
import { PlansReference } from '@/components/entries/plans-reference'
import { Prose } from '@/components/prose/prose'
import { NoticeLine } from '@/components/ui/notice-line'
import { formatDate } from '@/lib/format/date'
import type { Answer, Entry, Remark } from '@/lib/schemas/post'

export type Shown = Entry | Answer

/** The cautions that hold; waived ones are for the entry's own page. */
export const standing = (post: Shown) => post.cautions.filter((c) => c.waived === undefined)

export function Found({ entry }: { entry: Entry }) {
  return (
    <section className="grid content-start gap-4 border-b border-line px-5 py-4 lg:border-r lg:border-b-0" aria-label="Found">
      <CautionLine cautions={standing(entry)} wide />
      <Prose html={entry.html} small />
      <Plans entry={entry} />
      <Remarks post={entry} />
    </section>
  )
}

function Plans({ entry }: { entry: Entry }) {
  if (entry.plans.length === 0) return null
  return <p><span className="label mr-3">Plans</span>{entry.plans.map((p) => <span key={`${p.page} ${p.step ?? ''}`} className="block"><PlansReference {...p} /></span>)}</p>
}

export function Advice({ post }: { post: Shown }) {
  const now = { ...post.outcomes, items: post.outcomes.items.filter((o) => o.revision === post.revision) }
  return (
    <section className="grid content-start gap-4 px-5 py-4" aria-label={post.kind === 'answer' ? 'What to do' : 'Text'}>
      <CautionLine cautions={standing(post)} wide />
      <PlanChanges changes={post.planChanges} />
      <Prose html={post.html} />
      {post.kind === 'question' && 'plans' in post ? <Plans entry={post} /> : null}
      {now.items.length > 0 ? <HowItWent outcomes={now} critical={post.needsTwo} notes /> : null}
      <Failures post={post} />
      <Remarks post={post} />
    </section>
  )
}

/** Each report that it did not work, with its words: what a stamp in question is about. */
function Failures({ post }: { post: Shown }) {
  const failed = post.outcomes.items.filter((o) => o.result === 'did-not-work')
  if (failed.length === 0) return null
  return (
    <ul className="grid gap-2">
      {failed.map((o) => <li key={`${o.author.name} ${o.createdAt}`}><NoticeLine boxed><b>Did not work</b> for {o.author.name}, {formatDate(o.createdAt)}, on Rev {o.revision}: {o.note}</NoticeLine></li>)}
    </ul>
  )
}

function Remarks({ post }: { post: Shown }) {
  if (post.remarks.length === 0) return null
  return (
    <div className="grid gap-3">
      <h3 className="label">Remarks</h3>
      <ul className="grid gap-3">{post.remarks.map((r) => <li key={r.id}><OneRemark remark={r} known={post.cautions.filter((c) => !c.waived).map((c) => c.code)} /></li>)}</ul>
    </div>
  )
}

/** A remark shows what its own words require beyond its post's lines, which stand right above. */
function OneRemark({ remark, known }: { remark: Remark; known: readonly string[] }) {
  return (
    <>
      <p className="text-small text-ink-soft">{remark.author.name} · {formatDate(remark.createdAt)}</p>
      <CautionLine cautions={remark.cautions.filter((c) => !known.includes(c.code))} />
      <Prose html={remark.html} small />
    </>
  )
}
