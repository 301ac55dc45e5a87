// The brief for paper: two pages, cautions on the first.
import type { Metadata } from 'next'
import { BriefPrint } from '@/components/briefs/brief-print'
import { PageTitle } from '@/components/layout/page-title'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { pageContext } from '@/lib/auth/guards'
import { env } from '@/lib/env'
import { paths } from '@/lib/paths'
import { requireBrief } from '../require-brief'

export const metadata: Metadata = { title: 'Print the brief' }

export default async function BriefPrintPage({ params }: PageProps<'/kits/[kit]/[section]/brief/print'>) {
  const brief = await requireBrief(await pageContext(), await params)
  const { kit, section } = brief
  const address = paths.brief(kit.slug, section.code)
  return (
    <article className="brief-paper page-body">
      <div className="button-row no-print"><PrintButton /><LinkButton href={address}>Back to the brief</LinkButton></div>
      <PageTitle kicker={`Brief · ${kit.name}`} title={`${section.code} ${section.title}`} />
      <BriefPrint brief={brief} address={`${env().publicUrl}${address}`} />
    </article>
  )
}
