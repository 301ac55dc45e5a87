// A single-line field with its label, help and error. Native attributes (name, type, defaultValue, required …) pass through.
import type { ComponentProps } from 'react'
import { Field, controlProps, type FieldProps } from './field'

export type TextFieldProps = FieldProps & Omit<ComponentProps<'input'>, keyof FieldProps | 'className'>

export function TextField({ id, label, help, error, optional, type = 'text', ...rest }: TextFieldProps) {
  const field = { id, label, help, error, optional: optional ?? false }
  return <Field {...field}><input type={type} {...rest} {...controlProps(field)} /></Field>
}
