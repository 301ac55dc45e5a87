// The plan steps of a section: page, step, revision and what is done there. Stewards change them here.
import type { Metadata } from 'next'
import Link from 'next/link'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { LinesForms } from '@/components/kits/lines-forms'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { pageContext } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { listPlaces } from '@/lib/services/kits/list-places'
import { asLines } from '@/lib/services/plans/as-lines'
import { getPlanSteps, type PlanStepLine } from '@/lib/services/plans/get-section-lists'
import { planStepColumns } from '@/lib/services/plans/keep-plan-steps'
import { planStepAction, planStepsAction } from '../../../actions'
import { atSection } from '../at-section'

export const metadata: Metadata = { title: 'Plan steps' }

export default async function PlanStepsPage({ params }: PageProps<'/kits/[kit]/[section]/plans'>) {
  const context = await pageContext()
  const { kit, section, mayKeep, steps } = await atSection(params, (slug, code) => getPlanSteps(context, slug, code))
  const place = { kit: kit.slug, section: section.code }
  return (
    <>
      <PageTitle kicker={`${kit.name} · ${section.code} ${section.title}`} title="Plan steps"
        aside={<div className="button-row"><LinkButton href={paths.section(kit.slug, section.code)}>Section {section.code}</LinkButton><LinkButton href={paths.bulletins(kit.slug)}>Bulletins</LinkButton></div>} />
      <NoticeLine icon="plans">Where each step stands and what is done there, as a steward entered it. The plans’ own text is not here: read it on your page, in the revision in force.</NoticeLine>
      {steps.length === 0 ? <EmptyState title="No plan steps entered yet">A steward enters page, step and task, in the plans’ order.</EmptyState> : <StepTable steps={steps} kit={kit.slug} />}
      {mayKeep ? (
        <Sheet as="section" labelledBy="keep-steps">
          <SheetHead id="keep-steps" title="Enter plan steps" note="page, step and task only" />
          <LinesForms id="steps" place={place} rowAction={planStepAction} linesAction={planStepsAction} columns={planStepColumns} example={'page,step,revision,task\nW3-1,2,C,deburr-edges'} button="Add this step" now={asLines(planStepColumns, steps.map((s) => ({ ...s, task: s.task?.slug ?? '' })))}
            fields={[
              { name: 'page', label: 'Page', maxLength: 40, autoComplete: 'off' }, { name: 'step', label: 'Step', maxLength: 20, autoComplete: 'off' },
              { name: 'revision', label: 'Revision of the page', maxLength: 20, optional: true, autoComplete: 'off' },
              { name: 'task', label: 'What is done there', kind: 'select', optional: true, options: [{ value: '', label: 'not named' }, ...(await taskOptions(context))] },
            ]} />
        </Sheet>
      ) : null}
    </>
  )
}

async function taskOptions(context: Parameters<typeof listPlaces>[0]): Promise<{ value: string; label: string }[]> {
  const { operations } = await listPlaces(context)
  return operations.flatMap((o) => o.tasks.map((t) => ({ value: t.slug, label: t.title })))
}

function StepTable({ steps, kit }: { steps: readonly PlanStepLine[]; kit: string }) {
  return (
    <div className="sheet relative overflow-x-auto" role="group" aria-label="Table of plan steps" tabIndex={0}>
      <table className="w-full text-left">
        <caption className="sr-only">Plan steps in the plans’ order</caption>
        <thead className="bg-inset"><tr>{['Page', 'Step', 'Rev', 'What is done'].map((head) => <th key={head} scope="col" className="label px-4 py-3">{head}</th>)}</tr></thead>
        <tbody>
          {steps.map((s) => (
            <tr key={s.id} className="border-t border-line align-baseline">
              <th scope="row" className="code px-4 py-3 font-bold whitespace-nowrap">{s.page}</th>
              <td className="code px-4 py-3">{s.step}</td>
              <td className="code px-4 py-3">{s.revision || <span className="text-ink-soft">not noted</span>}</td>
              <td className="px-4 py-3">{s.task ? s.task.title : <span className="text-ink-soft">not named</span>}{s.changes.map((c) => <Link key={c.bulletin} className="block" href={paths.bulletins(kit, c.bulletin)}>Bulletin {c.bulletin}{c.revision ? `, Rev ${c.revision}` : ''}</Link>)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
