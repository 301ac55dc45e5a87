// Navigation within reach of a thumb, on phones only. The page makes room below itself for it (layout.css).
import Link from 'next/link'
import { Icon } from '@/components/ui/icon'
import type { BarItem } from './nav-items'

/** Three to five items. */
export function BottomBar({ items }: { items: readonly BarItem[] }) {
  return (
    <nav className="bottom-bar" aria-label="Bottom bar">
      <ul>
        {items.map((item) => (
          <li key={item.href}>
            <Link href={item.href} aria-current={item.current ? 'page' : undefined}><Icon name={item.icon} />{item.label}</Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}
