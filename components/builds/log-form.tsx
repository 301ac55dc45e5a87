'use client'
// A line of the log: the day, how long (hours, or start and stop), page and steps, who helped, one line. One column, in pairs, for one hand.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { TextField } from '@/components/ui/text-field'
import { useForm, type FormAction } from '@/components/ui/use-form'

export interface LogFormProps {
  action: FormAction
  /** Unique on the page; the fields' ids begin with it. */
  id: string
  button: string
  hidden: Readonly<Record<string, string | number>>
  initial: Readonly<Partial<Record<LogFieldName, string>>>
}
type LogFieldName = 'day' | 'hours' | 'start' | 'stop' | 'page' | 'steps' | 'helpers' | 'line'

interface LogField { name: LogFieldName; label: string; type?: 'date' | 'time'; maxLength?: number; optional?: true; help?: string; wide?: true }
const fields: readonly LogField[] = [
  { name: 'day', label: 'Day', type: 'date' },
  { name: 'hours', label: 'Hours', maxLength: 20, help: 'Such as 2.5 or 2:30. Or:' },
  { name: 'start', label: 'Started', type: 'time', optional: true },
  { name: 'stop', label: 'Stopped', type: 'time', optional: true },
  { name: 'line', label: 'In one line', maxLength: 300, optional: true, wide: true },
  { name: 'page', label: 'Plans page', maxLength: 40, optional: true },
  { name: 'steps', label: 'Steps', maxLength: 60, optional: true },
  { name: 'helpers', label: 'Who helped', maxLength: 120, optional: true, wide: true },
]

export function LogForm({ action, id, button, hidden, initial }: LogFormProps) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const errors = state.errors.map((e) => ({ id: `${id}-${e.path}`, message: e.message }))
  return (
    <form ref={form} action={submit} noValidate className="grid max-w-2xl gap-4">
      <ErrorSummary errors={errors.length > 0 ? errors : state.message ? [{ message: state.message }] : []} />
      {state.done ? <NoticeLine boxed live>{state.done}</NoticeLine> : null}
      {Object.entries(hidden).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      <div className="field-pairs">
        {fields.map(({ name, wide, ...field }) => (
          <div key={name} className={wide ? 'field-wide' : undefined}>
            <TextField id={`${id}-${name}`} name={name} autoComplete="off" error={errorOf(name)} defaultValue={valueOf(name, initial[name] ?? '')} {...field} />
          </div>
        ))}
      </div>
      <div className="button-row button-row-wide"><Button type="submit" look="primary" disabled={isPending}>{button}</Button></div>
    </form>
  )
}
