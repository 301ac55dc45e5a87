// The frame of one form field: label above, error in words, the control, help below. The control itself is a child, or one of
// text-field.tsx, text-area.tsx and select.tsx, which wire their control with controlProps.
import type { ReactNode } from 'react'

export interface FieldProps {
  /** The control's id; help and error get ids made from it. */
  id: string
  label: string
  help?: ReactNode
  /** What is wrong and what to do, in words. */
  error?: string | undefined
  optional?: boolean
}

/** The attributes that tie a control to its label, help and error. */
export function controlProps({ id, help, error }: FieldProps) {
  const described = [error ? `${id}-error` : '', help ? `${id}-help` : ''].filter(Boolean).join(' ')
  return {
    id,
    className: 'control',
    'aria-invalid': error ? (true as const) : undefined,
    'aria-describedby': described || undefined,
  }
}

/** Error and help of a field or group, with the ids that controlProps refers to. */
export function FieldError({ id, error }: { id: string, error?: string | undefined }) {
  if (!error) return null
  return <p id={`${id}-error`} className="field-error">{error}</p>
}

export function Field({ children, ...field }: FieldProps & { children: ReactNode }) {
  const { id, label, help, error, optional } = field
  return (
    <div className="field">
      <label htmlFor={id} className="field-label">
        {label}{optional ? <span className="field-optional"> (optional)</span> : null}
      </label>
      <FieldError id={id} error={error} />
      {children}
      {help ? <p id={`${id}-help`} className="field-help">{help}</p> : null}
    </div>
  )
}
