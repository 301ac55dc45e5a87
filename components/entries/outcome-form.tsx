'use client'
// How it went: one report a builder and post, on the revision that stands.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { ChoiceGroup, RadioRow } from '@/components/ui/radio-row'
import { TextArea } from '@/components/ui/text-area'
import { useForm, type FormAction } from '@/components/ui/use-form'

export interface OutcomeFormProps { action: FormAction; postId: number; revision: string; critical: boolean; told: { result: string; note: string } | null }

export function OutcomeForm({ action, postId, revision, critical, told }: OutcomeFormProps) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const chosen = valueOf('result', told?.result ?? '')
  const choices = [
    { value: 'as-written', label: critical ? 'Went together as written' : 'As written', help: 'nothing changed' },
    { value: 'with-change', label: 'With a change', help: 'say what' },
    { value: 'did-not-work', label: 'Did not work', help: critical ? 'say why; a mentor will look again' : 'say why' },
  ]
  return (
    <form ref={form} action={submit} className="form-small">
      {state.message ? <ErrorSummary errors={[{ id: `result-${postId}`, message: state.message }]} /> : null}
      <input type="hidden" name="postId" value={postId} />
      <ChoiceGroup id={`result-${postId}`} legend={`How it went with Rev ${revision}`} error={errorOf('result')}>
        {choices.map((c) => <RadioRow key={c.value} name="result" value={c.value} label={c.label} help={c.help} defaultChecked={chosen === c.value} required />)}
      </ChoiceGroup>
      <TextArea id={`note-${postId}`} name="note" label="In a line or two" rows={2} maxLength={1000} defaultValue={valueOf('note', told?.note ?? '')} error={errorOf('note')} />
      <Button type="submit" disabled={isPending}>{told ? 'Change what I told' : 'Tell how it went'}</Button>
    </form>
  )
}
