// A text of several lines with its label, help and error. It grows with what is typed where the browser can.
import type { ComponentProps } from 'react'
import { Field, controlProps, type FieldProps } from './field'

export type TextAreaProps = FieldProps & Omit<ComponentProps<'textarea'>, keyof FieldProps | 'className'>

export function TextArea({ id, label, help, error, optional, ...rest }: TextAreaProps) {
  const field = { id, label, help, error, optional: optional ?? false }
  return <Field {...field}><textarea {...rest} {...controlProps(field)} /></Field>
}
