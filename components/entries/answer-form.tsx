'use client'
// What to do: one row under a question, new or edited. Works without JavaScript: the server asks for acknowledgements.
import dynamic from 'next/dynamic'
import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Select } from '@/components/ui/select'
import { TextArea } from '@/components/ui/text-area'
import { one, many, type FormValues } from '@/lib/client/form-values'
import { useDraft } from '@/lib/client/use-draft'
import type { Answer } from '@/lib/schemas/post'
import { Acknowledge } from './acknowledge'
import { ConflictNotice } from './conflict-notice'
import { DraftNotice } from './draft-notice'
import { useForm, type FormAction } from '@/components/ui/use-form'

const WritingAid = dynamic(() => import('./writing-aid'), { ssr: false })

export interface AnswerFormProps {
  action: FormAction
  question: { id: number; title: string; text: string; kit: string; sections: string[]; tasks: string[]; hardware: string[] }
  /** `questionId` for a new row; `answerId`, `revision`, `body`, `makerReply` for an edit. */
  initial: FormValues
  submission: string
  memberId: number
}

export function AnswerForm({ action, question, initial, submission, memberId }: AnswerFormProps) {
  const { state, submit, isPending, form, errorOf } = useForm(action)
  const isEdit = one(initial, 'answerId') !== ''
  const isRefused = state.message !== ''
  const { restored, generation, throwAway } = useDraft(form, `draft:${memberId}:${isEdit ? `answer-${one(initial, 'answerId')}` : `say-${question.id}`}`, state)
  const values: FormValues = isRefused ? { ...initial, ...state.values } : restored ? { ...initial, ...restored.values } : initial
  const [body, setBody] = useState<string | null>(null)
  const present = state.current as Answer | undefined
  const written = body ?? one(values, 'body')
  return (
    <form ref={form} action={submit} className="sheet answer-form" onInput={(e) => setBody(new FormData(e.currentTarget).get('body') as string)} onFocus={() => setBody((b) => b ?? written)}>
      <h2>{isEdit ? 'Edit what to do' : 'Say what to do'}</h2>
      {isRefused ? <ErrorSummary errors={[{ id: state.cautions ? 'acknowledge' : 'answer-body', message: state.message }, ...state.errors.filter((e) => e.message !== state.message).map((e) => ({ message: e.message }))]} /> : null}
      {restored && !isRefused ? <DraftNotice savedAt={restored.savedAt} onThrowAway={throwAway} /> : null}
      {present ? <ConflictNotice revision={present.revision} author={present.author.name} html={present.html} /> : null}
      {['questionId', 'answerId'].map((name) => one(initial, name) ? <input key={name} type="hidden" name={name} value={one(initial, name)} /> : null)}
      {isEdit ? <input type="hidden" name="revision" value={present?.revision ?? one(initial, 'revision')} /> : null}
      <input type="hidden" name="submission" value={submission} />
      <div key={generation} className="form-fields">
        <TextArea id="answer-body" name="body" label="What to do, step by step" rows={8} maxLength={20000} required defaultValue={one(values, 'body')} error={errorOf('body')}
          help="Markdown works: lists, tables, emphasis. On a critical part the advice is: stop, measure, ask the kit maker." />
        <Select id="answer-reply" name="makerReply" label="Does it pass on a kit maker’s written reply?" optional defaultValue={one(values, 'makerReply')} key={`reply-${one(values, 'makerReply')}`} error={errorOf('makerReply')}>
          <option value={isEdit ? 'none' : ''}>No</option>
          <option value="bulletin">Yes, a bulletin</option>
          <option value="all-kits">Yes, good for all kits</option>
          <option value="one-serial">Yes, for one serial only</option>
        </Select>
      </div>
      {body === null ? <Acknowledge cautions={state.cautions ?? []} acknowledged={many(state.values, 'acknowledged')} />
        : <WritingAid text={{ title: question.title, body: `${question.text}\n\n${written}`, kit: question.kit, sections: question.sections, tasks: question.tasks, hardware: question.hardware, answerTo: { question: question.id, body: written } }} shown={written} wantsSimilar={false} acknowledged={many(state.values, 'acknowledged')} standing={state.cautions ?? []} />}
      <div className="button-row"><Button type="submit" look="primary" disabled={isPending}>{isPending ? 'Posting' : isEdit ? 'Post the new revision' : 'Post this row'}</Button></div>
    </form>
  )
}
