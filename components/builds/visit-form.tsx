'use client'
// Makes a link to a section's visit sheet and shows it, once: only its hash is kept.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { TextField } from '@/components/ui/text-field'
import { useForm, type FormAction } from '@/components/ui/use-form'

export function VisitForm({ action, buildId, section }: { action: FormAction; buildId: number; section: string }) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const errors = state.errors.map((e) => ({ id: `visit-${e.path}`, message: e.message }))
  return (
    <form ref={form} action={submit} noValidate className="grid max-w-2xl gap-4">
      <ErrorSummary errors={errors.length > 0 ? errors : state.message ? [{ message: state.message }] : []} />
      {state.done ? (
        <NoticeLine boxed live><b>Copy it now: it is shown once.</b> <a href={valueOf('address')} className="block break-all py-2">{valueOf('address')}</a> Whoever has it sees this section and can write findings.</NoticeLine>
      ) : null}
      <input type="hidden" name="buildId" value={buildId} />
      <input type="hidden" name="section" value={section} />
      <TextField id="visit-visitor" name="visitor" label="Whom is it for?" maxLength={80} autoComplete="off" defaultValue={state.done ? '' : valueOf('visitor')} error={errorOf('visitor')} />
      <TextField id="visit-days" name="days" label="For how many days?" inputMode="numeric" maxLength={2} autoComplete="off" defaultValue={state.done ? '14' : valueOf('days', '14')} error={errorOf('days')} />
      <div className="button-row"><Button type="submit" disabled={isPending}>Make a link</Button></div>
    </form>
  )
}
