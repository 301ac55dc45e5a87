// The foot of every page: the plans win, every room as a link (the bottom bar of a phone holds only some), the switches of a page.
import Link from 'next/link'
import type { ReactNode } from 'react'
import type { NavItem } from './nav-items'
import { PlansWin } from './plans-win'

export interface SiteFooterProps {
  items: readonly NavItem[]
  maker?: string | undefined
  /** The switches for units and shift, and whatever else belongs at the very end. */
  end?: ReactNode
}

export function SiteFooter({ items, maker, end }: SiteFooterProps) {
  return (
    <footer className="page">
      <div className="site-footer">
        <PlansWin maker={maker} />
        <div className="site-footer-end">
          <nav aria-label="All rooms" className="site-footer-links">{items.map((item) => <Link key={item.href} href={item.href}>{item.label}</Link>)}</nav>
          {end}
        </div>
      </div>
    </footer>
  )
}
