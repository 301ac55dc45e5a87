'use client'
// A small form of plain fields and one button, described as data by the page: errors in words, what was typed stays, and it works
// without JavaScript. Forms that need more than fields in a column have files of their own.
import { useForm, type FormAction } from '@/components/ui/use-form'
import { Button, type ButtonLook } from './button'
import { ErrorSummary } from './error-summary'
import { NoticeLine } from './notice-line'
import { Select } from './select'
import { TextArea } from './text-area'
import { TextField } from './text-field'

export interface FormField {
  name: string
  label: string
  /** 'area' and 'select' name their element; anything else is an input's type. */
  kind?: 'text' | 'email' | 'password' | 'date' | 'area' | 'select'
  help?: string
  /** What stands in it before anybody types. */
  value?: string
  optional?: boolean
  maxLength?: number
  /** Lines of an area. */
  rows?: number
  autoComplete?: string
  placeholder?: string
  /** Choices of a select, in order. */
  options?: readonly { value: string; label: string }[]
}

export interface FieldsFormProps {
  action: FormAction
  /** Unique on the page; the fields' ids begin with it. */
  id: string
  fields: readonly FormField[]
  button: string
  look?: ButtonLook
  /** Values that travel along unseen. */
  hidden?: Readonly<Record<string, string | number>>
  /** What the button is about, for a screen reader, where several forms of one page look alike. */
  about?: string
}

export function FieldsForm({ action, id, fields, button, look = 'plain', hidden = {}, about }: FieldsFormProps) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const idOf = (path: string) => (fields.some((f) => f.name === path) ? { id: `${id}-${path}` } : {})
  const errors = state.errors.length > 0 ? state.errors.map((e) => ({ ...idOf(e.path), message: e.message })) : state.message ? [{ message: state.message }] : []
  // No browser bubbles: the server's words stand beside the field, in one voice and one language.
  return (
    <form ref={form} action={submit} noValidate className="grid max-w-2xl content-start gap-4">
      <ErrorSummary errors={errors} />
      {state.done ? <NoticeLine boxed live>{state.done}</NoticeLine> : null}
      {Object.entries(hidden).map(([name, value]) => <input key={name} type="hidden" name={name} value={value} />)}
      {fields.map((field) => <PlainField key={field.name} field={field} id={`${id}-${field.name}`} error={errorOf(field.name)} value={valueOf(field.name, field.value)} />)}
      <div className="button-row"><Button type="submit" look={look} disabled={isPending}>{button}{about ? <span className="sr-only">: {about}</span> : null}</Button></div>
    </form>
  )
}

function PlainField({ field, id, error, value }: { field: FormField; id: string; error: string | undefined; value: string }) {
  const { name, label, kind = 'text', help, optional = false, maxLength, rows = 3, autoComplete, placeholder, options = [] } = field
  const shared = { id, name, label, error, optional, ...(help ? { help } : {}) }
  if (kind === 'area') return <TextArea {...shared} rows={rows} maxLength={maxLength} placeholder={placeholder} defaultValue={value} />
  // The key draws it anew: a select does not follow a changed defaultValue when the form is reset after an action.
  if (kind === 'select') return <Select key={value} {...shared} defaultValue={value}>{options.map((o) => <option key={o.value} value={o.value}>{o.label}</option>)}</Select>
  return <TextField {...shared} type={kind} maxLength={maxLength} autoComplete={autoComplete} placeholder={placeholder} defaultValue={kind === 'password' ? undefined : value} />
}
