// A question: Found stays in view at the left while What to do runs at the right in numbered rows.
import { randomUUID } from 'node:crypto'
import { CautionLine } from '@/components/cautions/caution-line'
import { AnswerForm } from '@/components/entries/answer-form'
import { NumbersCheckSheet } from '@/components/entries/numbers-check-list'
import { PlansReference } from '@/components/entries/plans-reference'
import { Sheet, SheetHead, SheetParts } from '@/components/entries/sheet'
import { RivetLine } from '@/components/layout/rivet-line'
import { Prose } from '@/components/prose/prose'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import type { EntryPage } from '@/lib/services/entries/get-entry-page'
import { answerAction } from '../../write-actions'
import { AnswerRow, WaivedCautions } from './answer-row'
import { PostActs, PostStateNotice } from './post-foot'

export function DiscrepancySheet({ page, allCautions }: { page: EntryPage; allCautions: { code: string; title: string }[] }) {
  const { entry, rights, parts, maySay, memberId } = page
  const own = rights.get(entry.id)
  const count = entry.answers.length
  return (
    <div className="discrepancy">
      <div className="discrepancy-found" role="group" aria-label="Found, kept in view" tabIndex={0}>
        <Sheet as="section" labelledBy="found" id={`post-${entry.id}`}>
          <SheetHead id="found" title="Found" note={`${entry.author.name} · ${formatDate(entry.updatedAt)} · Rev ${entry.revision}`} />
          {own ? <PostStateNotice post={entry} rights={own} /> : null}
          <div className="sheet-cautions"><CautionLine cautions={entry.cautions.filter((c) => !c.waived)} wide /><WaivedCautions post={entry} /></div>
          <SheetParts parts={parts.map((p) => ({ label: p.label || 'Found', content: p.name === 'plansSay' ? <><PlansLines page={page} /><Prose html={p.html} small /></> : <Prose html={p.html} small /> }))} />
          {own ? <PostActs post={entry} rights={own} allCautions={allCautions} plans={entry.plans[0]} similar={page.otherCases} /> : null}
        </Sheet>
        <NumbersCheckSheet posts={[{ label: 'Found', checks: own?.checks ?? [] }, ...entry.answers.map((a, i) => ({ label: `Row ${i + 1}`, checks: rights.get(a.id)?.checks ?? [] }))]} kit={entry.kit} />
      </div>
      <div className="discrepancy-do">
        <RivetLine title="What to do" note={count === 0 ? 'no rows yet' : `${count} ${count === 1 ? 'row' : 'rows'}, stamped first`} />
        {count === 0 ? <EmptyState title="Nobody has said what to do yet">Until somebody does: stop, measure, read the plans step again, and ask the kit maker.</EmptyState> : null}
        {entry.answers.map((answer, i) => {
          const right = rights.get(answer.id)
          return right ? <AnswerRow key={answer.id} answer={answer} number={i + 1} rights={right} allCautions={allCautions} plans={entry.plans[0]} /> : null
        })}
        <section id="say" className="no-print" aria-label="Say what to do" tabIndex={-1}>
          {maySay ? <AnswerForm key={`say-${count}`} action={answerAction} question={{ id: entry.id, title: entry.title, text: entry.text, kit: entry.kit, sections: entry.sections, tasks: entry.tasks, hardware: entry.hardware }} initial={{ questionId: String(entry.id) }} submission={randomUUID()} memberId={memberId} />
            : entry.state === 'visible' ? <LinkButton href={paths.signIn(paths.entry(entry.id))}>Sign in to say what to do</LinkButton> : null}
        </section>
      </div>
    </div>
  )
}

function PlansLines({ page: { entry } }: { page: EntryPage }) {
  return entry.plans.map((p) => <p key={`${p.page} ${p.step ?? ''}`} className="plans-line"><PlansReference {...p} /></p>)
}
