// Edit an entry: the same form with its present text. Posting makes a new revision.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { EntryForm } from '@/components/entries/entry-form'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { PageTitle } from '@/components/layout/page-title'
import { NoticeLine } from '@/components/ui/notice-line'
import { memberContext } from '@/lib/auth/guards'
import type { FormValues } from '@/lib/client/form-values'
import { orNotFound } from '@/lib/http/or-not-found'
import type { Entry } from '@/lib/schemas/post'
import { getEditableEntry, listHardware } from '@/lib/services/entries/get-writing-page'
import { listPlaces } from '@/lib/services/kits/list-places'
import { editLessonAction, editQuestionAction } from '../../write-actions'

export const metadata: Metadata = { title: 'Edit' }

export default async function EditEntryPage({ params }: PageProps<'/entries/[id]/edit'>) {
  const context = await memberContext()
  const entry = await orNotFound((await params).id, (id) => getEditableEntry(context, id))
  const [places, hardware] = [await listPlaces(context), await listHardware(context)]
  const hasStamps = entry.answers.some((a) => a.stamps.some((s) => s.live)) || entry.stamps.some((s) => s.live)
  return (
    <div className="writing page-body">
      <PageTitle title={entry.kind === 'question' ? 'Edit the question' : 'Edit the lesson'} kicker={`Rev ${entry.revision}`} lead="Posting makes the next revision. The old one stays readable." />
      {hasStamps ? <NoticeLine boxed>Stamps {entry.kind === 'question' ? 'on its rows' : 'on it'} lapse with an edit: mentors have to look again.</NoticeLine> : null}
      <CautionPlate cautions={entry.cautions.filter((c) => !c.waived)} />
      <EntryForm action={entry.kind === 'question' ? editQuestionAction : editLessonAction} kind={entry.kind} places={{ ...places, hardware }} initial={valuesOf(entry)} editing={{ id: entry.id, revision: entry.revision }} submission={randomUUID()} memberId={context.actor.id} />
    </div>
  )
}

function valuesOf(entry: Entry): FormValues {
  const parts = Object.fromEntries(Object.entries(entry.parts ?? {}).map(([name, value]) => [name, String(value)]))
  return {
    ...parts, body: entry.body, title: entry.title, place: `${entry.kit}/${entry.sections[0] ?? ''}`, also: entry.sections[1] ? `${entry.kit}/${entry.sections[1]}` : '', more: entry.sections.slice(2),
    task: entry.tasks, hardware: entry.hardware, planPage: entry.plans.map((p) => p.page), planStep: entry.plans.map((p) => p.step ?? ''), planRevision: entry.plans.map((p) => p.revision ?? ''),
    before: entry.orderAdvice.map((o) => o.before), after: entry.orderAdvice.map((o) => o.after),
  }
}
