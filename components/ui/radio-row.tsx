// One choice of several, in its own ruled row; and the group that names the question and shows what is wrong with the choice.
import type { ComponentProps, ReactNode } from 'react'
import { FieldError } from './field'

export type RadioRowProps = Omit<ComponentProps<'input'>, 'type' | 'className'> & { label: ReactNode, help?: ReactNode }

export function RadioRow({ label, help, ...rest }: RadioRowProps) {
  return (
    <label className="choice choice-boxed">
      <input type="radio" {...rest} />
      <span><b>{label}</b>{help ? <> <span className="choice-help">{help}</span></> : null}</span>
    </label>
  )
}

export interface ChoiceGroupProps {
  id: string
  legend: string
  error?: string | undefined
  children: ReactNode
}

/** A fieldset for radio rows or checkboxes. The id is a target for the error summary. */
export function ChoiceGroup({ id, legend, error, children }: ChoiceGroupProps) {
  return (
    <fieldset id={id} tabIndex={-1} className="choice-group" aria-describedby={error ? `${id}-error` : undefined}>
      <legend className="field-label mb-1.5">{legend}</legend>
      <FieldError id={id} error={error} />
      {children}
    </fieldset>
  )
}
