// Navigation within reach of a thumb, on phones only. The page makes room below itself for it (layout.css).
import { Icon } from '@/components/ui/icon'
import type { BarItem } from './nav-items'
import { NavLink } from './nav-link'

/** Three to five items. */
export function BottomBar({ items }: { items: readonly BarItem[] }) {
  return (
    <nav className="bottom-bar" aria-label="Bottom bar">
      <ul>
        {items.map((item) => (
          <li key={item.href}>
            <NavLink href={item.href}><Icon name={item.icon} />{item.label}</NavLink>
          </li>
        ))}
      </ul>
    </nav>
  )
}
