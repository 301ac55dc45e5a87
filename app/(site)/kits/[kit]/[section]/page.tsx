// What is known about one section, newest first.
import type { Metadata } from 'next'
import Link from 'next/link'
import { HitList, HitPlate } from '@/components/entries/hit-list'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { pathSegment } from '@/lib/http/path-segment'
import { paths } from '@/lib/paths'
import { notFound } from 'next/navigation'
import { getSectionPage } from '@/lib/services/kits/get-section-page'

export async function generateMetadata({ params }: PageProps<'/kits/[kit]/[section]'>): Promise<Metadata> {
  const { section } = await params
  return { title: pathSegment(section) ?? 'Section' }
}

export default async function SectionPage({ params }: PageProps<'/kits/[kit]/[section]'>) {
  const context = await pageContext()
  const { kit, section } = await params
  const code = pathSegment(section)
  const page = code === null ? null : await getSectionPage(context, kit, code)
  if (!page) notFound()
  const here = { kit: page.kit.slug, section: page.code }
  return (
    <>
      <PageTitle kicker={`${page.kit.name} · ${page.system}`} title={`${page.code} ${page.title}`} aside={<div className="button-row"><LinkButton href={paths.brief(here.kit, here.section)} look="primary">Brief</LinkButton><LinkButton href={paths.ask(here)}>Ask about it</LinkButton><LinkButton href={paths.lesson(here)}>Write a lesson</LinkButton>{page.buildId === null ? null : <LinkButton href={paths.buildSection(page.buildId, page.code)}>My section</LinkButton>}</div>} />
      <p className="flex flex-wrap gap-x-6 gap-y-2"><Link href={paths.planSteps(here.kit, here.section)}>Plan steps</Link><Link href={paths.sectionLists(here.kit, here.section)}>Hardware and closing list</Link><Link href={paths.bulletins(here.kit)}>Bulletins</Link></p>
      {page.hits.length === 0 ? <EmptyState title="Nothing yet about this section" action={<LinkButton href={paths.ask(here)} look="primary">Ask the first question</LinkButton>}>Whoever finishes it first can spare the others an evening.</EmptyState> : (
        <>
          <HitPlate hits={page.hits} />
          <RivetLine title="Newest first" />
          <HitList hits={page.hits} />
          {page.total > page.hits.length ? <p><LinkButton href={paths.search(here)}>All {page.total}</LinkButton></p> : null}
        </>
      )}
    </>
  )
}
