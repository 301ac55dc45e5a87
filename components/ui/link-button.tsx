// A link that looks like a button: for going somewhere, never for doing something.
import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { buttonClass, type ButtonLook } from './button'

export interface LinkButtonProps {
  href: Route
  look?: ButtonLook
  small?: boolean
  className?: string
  children: ReactNode
}

export function LinkButton({ href, look = 'plain', small = false, className = '', children }: LinkButtonProps) {
  return <Link href={href} className={buttonClass(look, small, className)}>{children}</Link>
}
