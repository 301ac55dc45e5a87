'use client'
// Makes a personal token and shows it, once: it is stored hashed and cannot be read again.
import { useForm, type FormAction } from '@/components/ui/use-form'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { TextField } from '@/components/ui/text-field'

export function TokenForm({ action }: { action: FormAction }) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  return (
    <form ref={form} action={submit} className="grid max-w-2xl gap-4">
      {state.message ? <ErrorSummary errors={[{ id: 'token-name', message: state.message }]} /> : null}
      {state.done ? (
        <NoticeLine boxed live>
          <b>Copy it now: it is shown once.</b> <code className="block break-all py-2">{valueOf('token')}</code> Whoever has it may do what you may do.
        </NoticeLine>
      ) : null}
      <TextField id="token-name" name="name" label="What is it for?" maxLength={80} autoComplete="off" defaultValue={valueOf('name')} error={errorOf('name')} help="Such as: the script that reads my section every morning." />
      <div className="button-row"><Button type="submit" disabled={isPending}>Make a token</Button></div>
    </form>
  )
}
