// A form or list that opens where it stands, with or without JavaScript: a native details element whose summary looks like a button.
import type { ReactNode } from 'react'
import { buttonClass, type ButtonLook } from './button'

export interface DisclosureProps {
  summary: ReactNode
  look?: ButtonLook
  small?: boolean
  open?: boolean
  id?: string
  children: ReactNode
}

export function Disclosure({ summary, look = 'plain', small = false, open = false, id, children }: DisclosureProps) {
  return (
    <details className="disclosure" open={open} id={id}>
      <summary className={buttonClass(look, small)}>{summary}</summary>
      <div className="disclosure-body">{children}</div>
    </details>
  )
}
