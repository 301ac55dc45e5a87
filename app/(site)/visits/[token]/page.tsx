// A visit sheet by its link: the section of somebody's build, and numbered lines for what the visitor finds. Without a sign-in.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { notFound } from 'next/navigation'
import { VisitSheet } from '@/components/builds/visit-sheet'
import { PageTitle } from '@/components/layout/page-title'
import { PlansWin } from '@/components/layout/plans-win'
import { RivetLine } from '@/components/layout/rivet-line'
import { FieldsForm } from '@/components/ui/fields-form'
import { PrintButton } from '@/components/ui/print-button'
import { AppError } from '@/lib/errors'
import { formatDate } from '@/lib/format/date'
import { getVisit, type VisitSheet as Sheet } from '@/lib/services/builds/get-visit'
import { ownContext } from '../../builds/own-context'
import { addFindingAction } from '../../builds/visit-actions'

// The address is the key. The policy of all pages (same-origin) keeps it out of Referers to elsewhere; a stricter one would take the Origin from the form.
export const metadata: Metadata = { title: 'Visit sheet', robots: { index: false } }

export default async function VisitPage({ params }: PageProps<'/visits/[token]'>) {
  const { token } = await params
  const { section, visitor, expiresAt, findings } = await getVisit(await ownContext(), token).catch((error: unknown): Sheet => {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  })
  return (
    <div className="page-body">
      <PageTitle kicker={`Visit sheet for ${visitor} · ${section.build.name} · ${section.build.kit.name}`} title={`${section.code} ${section.title}`} lead={`Open until ${formatDate(expiresAt)}, or until the builder closes it.`} aside={<PrintButton />} />
      <VisitSheet section={section} />
      <section className="grid gap-4" aria-labelledby="found">
        <RivetLine title="Found" id="found" note="each line becomes a hold" />
        {findings.length > 0 ? <ol className="sheet findings">{findings.map((f) => <li key={f.number}><b>{f.number}</b><span>{f.text} <span className="text-small text-ink-soft">{formatDate(f.createdAt)}</span></span></li>)}</ol> : null}
        <FieldsForm action={addFindingAction} id="finding" hidden={{ token, key: randomUUID() }} button={`Write line ${findings.length + 1}`} look="primary" fields={[
          { name: 'text', label: 'What did you find, and where?', kind: 'area', maxLength: 500, help: 'The builder goes past it only when it is put right.' },
        ]} />
      </section>
      <div className="print-only"><PlansWin maker={section.build.kit.maker} /></div>
    </div>
  )
}
