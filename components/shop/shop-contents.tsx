// The list of shop tables beside an open one.
import Link from 'next/link'
import { paths } from '@/lib/paths'

export function ShopContents({ tables, current }: { tables: readonly { slug: string; title: string }[]; current: string }) {
  return (
    <nav className="shop-contents no-print" aria-label="Shop tables">
      <h2><Link href={paths.shop}>Shop tables</Link></h2>
      <ul>
        {tables.map(({ slug, title }) => <li key={slug}><Link href={paths.shopTable(slug)} aria-current={slug === current ? 'page' : undefined}>{title}</Link></li>)}
      </ul>
    </nav>
  )
}
