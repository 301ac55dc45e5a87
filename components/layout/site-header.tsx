// The top of every page: skip link, mark and name, the search line, navigation. On a phone navigation is the bottom bar's.
import Link from 'next/link'
import type { ReactNode } from 'react'
import { Mark } from './mark'
import type { NavItem } from './nav-items'
import { NavLink } from './nav-link'

export interface SiteHeaderProps {
  items: readonly NavItem[]
  /** The search form. */
  search: ReactNode
  /** Something that is not a link at the end of the navigation, such as a sign-out form. */
  end?: ReactNode
}

export function SiteHeader({ items, search, end }: SiteHeaderProps) {
  return (
    <header className="site-header">
      <a href="#content" className="skip-link">Skip to the content</a>
      <div className="page site-header-row">
        <Link href="/" className="site-name" aria-label="Pilothole, first page"><Mark /><span className="site-name-words">Pilothole</span></Link>
        <div className="site-header-search">{search}</div>
        <nav className="site-nav" aria-label="Rooms">
          <ul>
            {items.map((item) => <li key={item.href}><NavLink href={item.href}>{item.label}</NavLink></li>)}
            {end ? <li className="site-nav-item">{end}</li> : null}
          </ul>
        </nav>
      </div>
    </header>
  )
}
