// Edit a row of What to do, with its question in view.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { AnswerForm } from '@/components/entries/answer-form'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { PageTitle } from '@/components/layout/page-title'
import { Prose } from '@/components/prose/prose'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { NoticeLine } from '@/components/ui/notice-line'
import { memberContext } from '@/lib/auth/guards'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { orNotFound } from '@/lib/http/or-not-found'
import { getEditableAnswer } from '@/lib/services/entries/get-writing-page'
import { editAnswerAction } from '../../../entries/write-actions'

export const metadata: Metadata = { title: 'Edit what to do' }

export default async function EditAnswerPage({ params }: PageProps<'/answers/[id]/edit'>) {
  const context = await memberContext()
  const { question, answer, body } = await orNotFound((await params).id, (id) => getEditableAnswer(context, id))
  return (
    <div className="writing page-body">
      <PageTitle title={question.title} kicker={`Edit what to do · Rev ${answer.revision}`} lead="Posting makes the next revision. The old one stays readable." />
      <CautionPlate cautions={unionCautions([question.cautions, answer.cautions]).filter((c) => !c.waived)} />
      {answer.stamps.some((s) => s.live) ? <NoticeLine boxed>Stamps on it lapse with an edit: mentors have to look again.</NoticeLine> : null}
      <Sheet as="section"><SheetHead title="Found" /><div className="sheet-body"><Prose html={question.html} small /></div></Sheet>
      <AnswerForm action={editAnswerAction} question={{ id: question.id, title: question.title, text: question.text, kit: question.kit, sections: question.sections, tasks: question.tasks, hardware: question.hardware }}
        initial={{ answerId: String(answer.id), revision: answer.revision, body, makerReply: answer.makerReply ?? 'none' }} submission={randomUUID()} memberId={context.actor.id} />
    </div>
  )
}
