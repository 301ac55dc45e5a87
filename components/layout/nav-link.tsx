'use client'
// One link of the navigation. A client leaf only to know where the reader is: layouts do not render again on the way.
import Link from 'next/link'
import { usePathname } from 'next/navigation'
import type { ReactNode } from 'react'
import type { NavItem } from './nav-items'

export function NavLink({ href, children }: { href: NavItem['href']; children: ReactNode }) {
  const here = usePathname()
  const target = href.split('?')[0] ?? href
  const isCurrent = here === target || (target !== '/' && here.startsWith(`${target}/`))
  return <Link href={href} aria-current={isCurrent ? 'page' : undefined}>{children}</Link>
}
