'use client'
// Which units stand first for a member, saved in their account.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { ChoiceGroup, RadioRow } from '@/components/ui/radio-row'
import { useForm, type FormAction } from '@/components/ui/use-form'
import { unitsChoices, type UnitsChoice } from '@/lib/format/units-choice'

export function UnitsForm({ action, units }: { action: FormAction; units: UnitsChoice }) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const chosen = valueOf('units', units)
  return (
    <form ref={form} action={submit} noValidate className="grid max-w-2xl content-start gap-4">
      <ErrorSummary errors={state.message ? [{ id: 'units-choice', message: errorOf('units') ?? state.message }] : []} />
      {state.done ? <NoticeLine boxed live>{state.done}</NoticeLine> : null}
      <ChoiceGroup id="units-choice" legend="Where a size is shown" error={errorOf('units')}>
        {/* The key draws them anew: a radio does not follow a changed default when the form is reset after an action. */}
        <div key={chosen} className="grid gap-2">
          {unitsChoices.map(({ value, label, help }) => <RadioRow key={value} name="units" value={value} label={label} help={help} defaultChecked={value === chosen} />)}
        </div>
      </ChoiceGroup>
      <div className="button-row"><Button type="submit" disabled={isPending}>Keep these units</Button></div>
    </form>
  )
}
