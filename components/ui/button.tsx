// The button: primary for the one act a sheet asks for, plain for the others, quiet for what reads like a link.
import type { ComponentProps } from 'react'

export type ButtonLook = 'primary' | 'plain' | 'quiet'

/** The class names of a button's look, shared with links and summaries that look like one. */
export function buttonClass(look: ButtonLook, small = false, extra = ''): string {
  return ['button', look === 'plain' ? '' : `button-${look}`, small ? 'button-small' : '', extra].filter(Boolean).join(' ')
}

export type ButtonProps = ComponentProps<'button'> & { look?: ButtonLook, small?: boolean }

/** A native button; `type` is "button" unless given, so that nothing is submitted by accident. */
export function Button({ look = 'plain', small = false, className = '', type = 'button', ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(look, small, className)} {...rest} />
}
