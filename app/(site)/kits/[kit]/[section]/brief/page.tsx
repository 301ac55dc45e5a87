// What to know before a section is begun, down its tasks in working order.
import type { Metadata } from 'next'
import { BriefSheet } from '@/components/briefs/brief-sheet'
import { DateText } from '@/components/ui/date-text'
import { PageTitle } from '@/components/layout/page-title'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { pathSegment } from '@/lib/http/path-segment'
import { paths } from '@/lib/paths'
import { requireBrief } from './require-brief'

export async function generateMetadata({ params }: PageProps<'/kits/[kit]/[section]/brief'>): Promise<Metadata> {
  const { section } = await params
  return { title: `Brief ${pathSegment(section) ?? ''}`.trim() }
}

export default async function BriefPage({ params }: PageProps<'/kits/[kit]/[section]/brief'>) {
  const brief = await requireBrief(await pageContext(), await params)
  const { kit, section } = brief
  return (
    <>
      <PageTitle kicker={`Brief · ${kit.name}`} title={`${section.code} ${section.title}`} lead={<>Brought up to date <DateText at={brief.preparedAt} /></>}
        aside={<div className="button-row"><LinkButton href={paths.briefPrint(kit.slug, section.code)}>Print, 2 pages</LinkButton><LinkButton href={paths.section(kit.slug, section.code)}>All of the section</LinkButton></div>} />
      <BriefSheet brief={brief} />
    </>
  )
}
