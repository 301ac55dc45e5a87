// A native select with its label, help and error; the options are children.
import type { ComponentProps } from 'react'
import { Field, controlProps, type FieldProps } from './field'

export type SelectProps = FieldProps & Omit<ComponentProps<'select'>, keyof FieldProps | 'className'>

export function Select({ id, label, help, error, optional, children, ...rest }: SelectProps) {
  const field = { id, label, help, error, optional: optional ?? false }
  return <Field {...field}><select {...rest} {...controlProps(field)}>{children}</select></Field>
}
