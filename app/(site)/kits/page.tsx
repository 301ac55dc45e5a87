// The kits of this group and their sections in plan order.
import type { Metadata } from 'next'
import Link from 'next/link'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { PartTag } from '@/components/entries/part-tag'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { pageContext } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { listPlaces } from '@/lib/services/kits/list-places'

export const metadata: Metadata = { title: 'Kits' }

export default async function KitsPage() {
  const { kits } = await listPlaces(await pageContext())
  return (
    <>
      <PageTitle title="Kits" lead="Sections in plan order. Each opens what is known about it." />
      {kits.length === 0 ? <EmptyState title="No kits yet">A steward adds the kits of your group.</EmptyState> : kits.map((kit) => (
        <Sheet as="section" key={kit.slug} labelledBy={kit.slug}>
          <SheetHead title={kit.name} id={kit.slug} note={kit.maker} />
          <ul className="sheet-body part-tags">
            {kit.sections.map((s) => <li key={s.code}><PartTag code={s.code} title={s.title} href={paths.section(kit.slug, s.code)} /></li>)}
          </ul>
          <p className="sheet-foot"><Link href={paths.kitLimits(kit.slug)}>{kit.maker}’s own limits<span className="sr-only"> for the {kit.name}</span></Link></p>
        </Sheet>
      ))}
    </>
  )
}
