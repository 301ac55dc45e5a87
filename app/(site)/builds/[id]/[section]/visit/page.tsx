// The visit sheet of a section for paper, with numbered lines for what is found.
import type { Metadata } from 'next'
import { VisitSheet } from '@/components/builds/visit-sheet'
import { PageTitle } from '@/components/layout/page-title'
import { PlansWin } from '@/components/layout/plans-win'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { formatDate } from '@/lib/format/date'
import { orNotFound } from '@/lib/http/or-not-found'
import { pathSegment } from '@/lib/http/path-segment'
import { paths } from '@/lib/paths'
import { getBuildSection } from '@/lib/services/builds/get-build-section'
import { ownContext } from '../../../own-context'

export const metadata: Metadata = { title: 'Visit sheet' }

export default async function PrintedVisitPage({ params }: PageProps<'/builds/[id]/[section]/visit'>) {
  const context = await ownContext()
  const { id: idInAddress, section: segment } = await params
  const section = await orNotFound(idInAddress, (id) => getBuildSection(context, id, pathSegment(segment) ?? ''))
  const shown = { ...section, log: section.log.map((line) => ({ ...line, helpers: '' })) }
  return (
    <div className="print-sheet page-body">
      <div className="button-row no-print"><PrintButton /><LinkButton href={paths.buildSection(section.build.id, section.code)}>Back to the section</LinkButton></div>
      <PageTitle kicker={`Visit sheet · ${section.build.name} · ${section.build.kit.name} · ${formatDate(context.now)}`} title={`${section.code} ${section.title}`} />
      <VisitSheet section={shown} />
      <div className="print-only">
        <h2>Found</h2>
        <ol className="written-lines">{Array.from({ length: 10 }, (_, i) => <li key={i}>{i + 1}</li>)}</ol>
      </div>
      <div className="print-only"><PlansWin maker={section.build.kit.maker} /></div>
    </div>
  )
}
