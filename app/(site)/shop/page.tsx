// The shop tables: each with one line and its figure small.
import type { Metadata } from 'next'
import Link from 'next/link'
import { Sheet } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { PlansWin } from '@/components/layout/plans-win'
import { FigureThumb } from '@/components/shop/figure-thumb'
import { pageContext } from '@/lib/auth/guards'
import { listPages } from '@/lib/content/load-page'
import { tableFigures } from '@/lib/domain/shop/figures/table-figures'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'

export const metadata: Metadata = { title: 'Shop tables' }

export default async function ShopPage() {
  await pageContext()
  const notes = await listPages('shop-notes')
  return (
    <>
      <PageTitle title="Shop tables" lead="Numbers worked out, each with its source. A check of a drawing you were given, not a way to design one." />
      <ul className="shop-list">
        {SHOP_TABLES.map((table) => {
          const outcome = table.compute({})
          const figure = outcome.ok ? tableFigures(table.slug, outcome.inputs, outcome.results, 640)[0] : undefined
          return (
            <li key={table.slug}>
              <Sheet className="h-full">
                <Link href={paths.shopTable(table.slug)} className="shop-card">
                  {figure ? <FigureThumb figure={figure} /> : null}
                  <b>{table.title}</b>
                  <span>{notes.find(({ slug }) => slug === table.slug)?.summary}</span>
                </Link>
              </Sheet>
            </li>
          )
        })}
      </ul>
      <PlansWin />
    </>
  )
}
