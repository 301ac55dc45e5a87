// One checkbox with its words; the whole row can be tapped.
import type { ComponentProps, ReactNode } from 'react'

export type CheckboxProps = Omit<ComponentProps<'input'>, 'type' | 'className'> & { label: ReactNode, help?: ReactNode, boxed?: boolean }

export function Checkbox({ label, help, boxed = false, ...rest }: CheckboxProps) {
  return (
    <label className={boxed ? 'choice choice-boxed' : 'choice'}>
      <input type="checkbox" {...rest} />
      <span>{label}{help ? <> <span className="choice-help">{help}</span></> : null}</span>
    </label>
  )
}
