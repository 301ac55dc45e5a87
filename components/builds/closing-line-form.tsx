'use client'
// A line of the closing list: done, with a note; or not done, with its reason.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { TextField } from '@/components/ui/text-field'
import { useForm, type FormAction } from '@/components/ui/use-form'

export interface ClosingLineFormProps { action: FormAction; buildId: number; itemId: number; text: string; note: string }

export function ClosingLineForm({ action, buildId, itemId, text, note }: ClosingLineFormProps) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const id = `closing-${itemId}-note`
  return (
    <form ref={form} action={submit} noValidate className="grid max-w-2xl gap-3">
      <ErrorSummary errors={state.message ? [{ id, message: errorOf('note') ?? state.message }] : []} />
      {state.done ? <NoticeLine live>{state.done}</NoticeLine> : null}
      <input type="hidden" name="buildId" value={buildId} />
      <input type="hidden" name="itemId" value={itemId} />
      <TextField id={id} name="note" label="Note, or why not" maxLength={300} autoComplete="off" error={errorOf('note')} defaultValue={valueOf('note', note)} />
      <div className="button-row" role="group" aria-label={text}>
        <Button type="submit" name="isDone" value="yes" disabled={isPending}>Done</Button>
        <Button type="submit" name="isDone" value="no" disabled={isPending}>Not done</Button>
      </div>
    </form>
  )
}
