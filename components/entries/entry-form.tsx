'use client'
// A question or a lesson, new or edited. One column; every field works without JavaScript, the rest is added to it.
import dynamic from 'next/dynamic'
import { useState, type FormEvent } from 'react'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { TextArea } from '@/components/ui/text-area'
import { TextField } from '@/components/ui/text-field'
import { formValues, many, one, type FormValues } from '@/lib/client/form-values'
import type { WritingText } from '@/lib/client/queries'
import { useDraft } from '@/lib/client/use-draft'
import { lessonParts, questionParts } from '@/lib/domain/entries/entry-text'
import type { Entry } from '@/lib/schemas/post'
import { Acknowledge } from './acknowledge'
import { ConflictNotice } from './conflict-notice'
import { DraftNotice } from './draft-notice'
import { HardwareFields, OrderAdviceFields, PlaceFields, PlansFields, TaskFields, type FormPlaces } from './place-fields'
import { useForm, type FormAction } from '@/components/ui/use-form'

const WritingAid = dynamic(() => import('./writing-aid'), { ssr: false })

export interface EntryFormProps {
  action: FormAction
  kind: 'question' | 'lesson'
  places: FormPlaces
  initial: FormValues
  /** Set on an edit: the entry and the letter one starts from. */
  editing?: { id: number; revision: string }
  submission: string
  memberId: number
}

const help: Record<string, string> = {
  doing: 'The part, the side, the step you are at.', plansSay: 'In your own words: never copy the plans’ text.', measured: 'Figures with units, and how you measured.', tried: 'What you did already, and what came of it.',
  happened: 'What you did and what came of it, with figures.', differently: 'What you would do next time.', tools: 'What helped, what did not.',
}

export function EntryForm({ action, kind, places, initial, editing, submission, memberId }: EntryFormProps) {
  const { state, submit, isPending, form, errorOf } = useForm(action)
  const isRefused = state.message !== ''
  const { restored, generation, throwAway } = useDraft(form, `draft:${memberId}:${editing ? `entry-${editing.id}` : kind}`, state)
  const values: FormValues = isRefused ? { ...initial, ...state.values } : restored ? { ...initial, ...restored.values } : initial
  const [writing, setWriting] = useState<FormValues | null>(null)
  const now = writing ?? values
  const parts = kind === 'question' ? questionParts : lessonParts
  const present = state.current as Entry | undefined
  const title = kind === 'question' ? 'What is the question?' : 'The lesson in one line'
  const onInput = (event: FormEvent<HTMLFormElement>) => setWriting(formValues(event.currentTarget))
  const text = parts.map(([name]) => one(now, name)).filter(Boolean).join('\n\n')
  return (
    <form ref={form} action={submit} className="entry-form" onInput={onInput} onFocus={() => setWriting((w) => w ?? values)}>
      {isRefused ? <ErrorSummary errors={[{ id: state.cautions ? 'acknowledge' : fieldId(state.errors[0]?.path), message: state.message }, ...state.errors.slice(1).map((e) => ({ id: fieldId(e.path), message: e.message }))]} /> : null}
      {restored && !isRefused ? <DraftNotice savedAt={restored.savedAt} onThrowAway={throwAway} /> : null}
      {present ? <ConflictNotice revision={present.revision} author={present.author.name} title={present.title} html={present.html} /> : null}
      {editing ? <><input type="hidden" name="entryId" value={editing.id} /><input type="hidden" name="revision" value={present?.revision ?? editing.revision} /></> : null}
      <input type="hidden" name="submission" value={submission} />
      <div key={`${generation} ${isRefused ? state.message : ''}`} className="form-fields">
        <TextField id="title" name="title" label={title} maxLength={160} required defaultValue={one(values, 'title')} error={errorOf('title')} help="Name the part and what is wrong or what you learned." />
        <PlaceFields places={places} values={values} error={errorOf('sections') ?? errorOf('kit')} />
        <TaskFields places={places} values={values} error={errorOf('tasks')} />
        <PlansFields values={values} error={errorOf('plans')} />
        {parts.map(([name, label]) => (
          <TextArea key={name} id={name} name={name} label={label} rows={name === 'doing' || name === 'happened' ? 6 : 4} maxLength={5000} defaultValue={one(values, name)} error={errorOf(`parts.${name}`) ?? (name === parts[0]?.[0] ? errorOf('parts') : undefined)} help={help[name]} />
        ))}
        {one(values, 'body') ? <TextArea id="body" name="body" label="Text" rows={10} maxLength={20000} defaultValue={one(values, 'body')} error={errorOf('body')} /> : null}
        <HardwareFields places={places} values={values} error={errorOf('hardware')} />
        {kind === 'lesson' ? (
          <>
            <OrderAdviceFields places={places} values={values} error={errorOf('orderAdvice')} />
            <TextField id="hours" name="hours" label="Hours it took" optional inputMode="decimal" defaultValue={one(values, 'hours')} error={errorOf('parts.hours')} />
          </>
        ) : null}
      </div>
      <div className="entry-aid">
        {writing === null ? (
          <>
            <p className="aid-hint">While you write: posts that may already answer it, a preview, and the cautions that will stand on it. Drafts stay on this device.</p>
            <Acknowledge cautions={state.cautions ?? []} acknowledged={many(state.values, 'acknowledged')} />
          </>
        ) : <WritingAid text={writingText(now, text)} shown={text} wantsSimilar={!editing} acknowledged={many(state.values, 'acknowledged')} standing={state.cautions ?? []} />}
      </div>
      <div className="button-row"><Button type="submit" look="primary" disabled={isPending}>{isPending ? 'Posting' : editing ? 'Post the new revision' : kind === 'question' ? 'Post the question' : 'Post the lesson'}</Button></div>
    </form>
  )
}

function writingText(values: FormValues, text: string): WritingText {
  const [kit, code] = one(values, 'place').split('/')
  const also = one(values, 'also').split('/')[1]
  return { title: one(values, 'title'), body: text, kit: kit || undefined, sections: [code, also].flatMap((c) => c || []), tasks: many(values, 'task').filter(Boolean), hardware: many(values, 'hardware').filter(Boolean) }
}

/** Where on the page a field of the request stands. */
function fieldId(path: string | undefined): string {
  if (!path) return 'title'
  const [first, second] = path.split('.')
  const ids: Record<string, string> = { kit: 'place', sections: 'place', tasks: 'tasks', plans: 'plans', hardware: 'hardware-0', orderAdvice: 'order-advice', acknowledgedCautions: 'acknowledge' }
  return first === 'parts' ? (second ?? 'title') : (ids[first ?? ''] ?? first ?? 'title')
}
