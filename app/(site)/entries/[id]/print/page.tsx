// An entry for paper: black on white, cautions with their signal words in full, basis of each stamp, the date, and where to check.
import type { Metadata } from 'next'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { CautionLine } from '@/components/cautions/caution-line'
import { PlanChanges } from '@/components/entries/plan-changes'
import { PlansReference } from '@/components/entries/plans-reference'
import { PageTitle } from '@/components/layout/page-title'
import { PrintNote } from '@/components/layout/print-note'
import { Prose } from '@/components/prose/prose'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { pageContext } from '@/lib/auth/guards'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { env } from '@/lib/env'
import { formatDate } from '@/lib/format/date'
import { stampCondition, stampSentence } from '@/lib/format/stamp-words'
import { orNotFound } from '@/lib/http/or-not-found'
import { paths } from '@/lib/paths'
import type { Answer, Entry } from '@/lib/schemas/post'
import { getEntryPage } from '@/lib/services/entries/get-entry-page'

export const metadata: Metadata = { title: 'Print' }

export default async function PrintPage({ params }: PageProps<'/entries/[id]/print'>) {
  const context = await pageContext()
  const page = await orNotFound((await params).id, (id) => getEntryPage(context, id))
  const { entry, kit, sections } = page
  const cautions = unionCautions([entry.cautions, ...entry.answers.map((a) => a.cautions)]).filter((c) => !c.waived)
  return (
    <article className="print-sheet page-body">
      <div className="button-row no-print"><PrintButton /><LinkButton href={paths.entry(entry.id)}>Back to the sheet</LinkButton></div>
      <PageTitle kicker={`${entry.kind === 'question' ? 'Discrepancy sheet' : 'Lesson'} ${entry.id} · ${kit.name} · ${sections.map((s) => `${s.code} ${s.title}`).join(', ')}`} title={entry.title} />
      <CautionPlate cautions={cautions} />
      {entry.plans.map((p) => <p key={p.page}><PlansReference {...p} /></p>)}
      <h2>{entry.kind === 'question' ? 'Found' : 'Lesson'}</h2>
      <PlanChanges changes={entry.planChanges} />
      <Prose html={entry.html} />
      <Stamps post={entry} />
      {entry.answers.map((a, i) => (
        <section key={a.id} className="print-row">
          <h2>What to do, row {i + 1}: {a.author.name}, Rev {a.revision}, {formatDate(a.updatedAt)}</h2>
          {a.state === 'visible' ? null : <p><b>{a.state === 'withdrawn' ? 'Withdrawn: do not go by this.' : 'Hidden.'}</b></p>}
          <CautionLine cautions={a.cautions.filter((c) => !c.waived)} />
          <PlanChanges changes={a.planChanges} />
          <Prose html={a.html} />
          <Stamps post={a} />
        </section>
      ))}
      <p><b>The plans win.</b> {kit.maker}’s current plans and bulletins, your authority’s rules and a licensed mechanic come first.</p>
      <PrintNote address={`${env().publicUrl}${paths.entry(entry.id)}`} printedAt={context.now} />
    </article>
  )
}

function Stamps({ post }: { post: Entry | Answer }) {
  if (post.kind === 'question') return null
  const o = post.outcomes
  return (
    <ul className="print-stamps">
      {post.stamps.length === 0 ? <li>No stamp.</li> : post.stamps.map((s) => <li key={s.id}>{stampSentence(s, stampCondition(s, post.stamp))}</li>)}
      {post.missing === 'second' || post.missing === 'firm-basis' ? <li>Needs a second stamp: two people, one of them on paper.</li> : null}
      {o.items.length > 0 ? <li>How it went: {o.asWritten} as written, {o.withChange} with a change, {o.didNotWork} did not work.</li> : null}
    </ul>
  )
}
