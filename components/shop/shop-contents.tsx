// The list of shop tables beside an open one.
import Link from 'next/link'
import { paths } from '@/lib/paths'

/** `kit` stays chosen from table to table. */
export function ShopContents({ tables, current, kit }: { tables: readonly { slug: string; title: string }[]; current: string; kit?: string | undefined }) {
  return (
    <nav className="shop-contents no-print" aria-label="Shop tables">
      <h2><Link href={paths.shop}>Shop tables</Link></h2>
      <ul>
        {tables.map(({ slug, title }) => <li key={slug}><Link href={paths.shopTable(slug, kit ? { kit } : {})} aria-current={slug === current ? 'page' : undefined}>{title}</Link></li>)}
      </ul>
    </nav>
  )
}
