// An entry: a question is a discrepancy sheet (Found beside What to do), a lesson one sheet with its title block.
import type { Metadata } from 'next'
import { cache } from 'react'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { PlansReference } from '@/components/entries/plans-reference'
import { PageTitle } from '@/components/layout/page-title'
import { PrintNote } from '@/components/layout/print-note'
import { TitleBlock } from '@/components/entries/title-block'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { cautionTable } from '@/lib/content/caution-table'
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import { env } from '@/lib/env'
import { orNotFound } from '@/lib/http/or-not-found'
import { paths } from '@/lib/paths'
import { getMergedInto } from '@/lib/services/entries/get-merged-into'
import { getEntryPage, type EntryPage } from '@/lib/services/entries/get-entry-page'
import { DiscrepancySheet } from './_components/discrepancy-sheet'
import { LessonSheet } from './_components/lesson-sheet'
import { OtherCases } from './_components/other-cases'

export async function generateMetadata({ params }: PageProps<'/entries/[id]'>): Promise<Metadata> {
  const { entry } = await load((await params).id)
  const words = entry.cautions.find((c) => !c.waived)
  return { title: words ? `${words.signalWord} ${words.title}: ${entry.title}` : entry.title }
}

/** Once a request: the title needs the entry as much as the page does. */
const load = cache(async (id: string): Promise<EntryPage & { now: number }> => {
  const context = await pageContext()
  return { ...(await orNotFound(id, (entryId) => getEntryPage(context, entryId), (entryId) => getMergedInto(context, entryId))), now: context.now }
})

export default async function EntryPageView({ params }: PageProps<'/entries/[id]'>) {
  const page = await load((await params).id)
  const { entry, kit } = page
  const isQuestion = entry.kind === 'question'
  const allCautions = cautionTable.cautions.map((c) => ({ code: c.code, title: c.title }))
  return (
    <div className="entry-page page-body">
      <PageTitle kicker={`${isQuestion ? 'Discrepancy sheet' : 'Lesson'} ${entry.id} · ${kit.name}`} title={entry.title} />
      <TitleBlock alone cells={headCells(page)} />
      <EntryPlate page={page} />
      {isQuestion ? <DiscrepancySheet page={page} allCautions={allCautions} /> : <LessonSheet page={page} allCautions={allCautions} />}
      <OtherCases hits={page.otherCases} />
      <p className="no-print"><LinkButton href={paths.entryPrint(entry.id)} look="quiet">Print this sheet</LinkButton></p>
      <PrintNote address={`${env().publicUrl}${paths.entry(entry.id)}`} printedAt={page.now} />
    </div>
  )
}

/** One grouped plate for the page: each line says where it applies. */
function EntryPlate({ page: { entry } }: { page: EntryPage }) {
  const standing = (p: { cautions: EntryPage['entry']['cautions'] }) => p.cautions.filter((c) => !c.waived)
  const posts = [{ where: entry.kind === 'question' ? 'Found' : 'Lesson', cautions: standing(entry) }, ...entry.answers.map((a, i) => ({ where: `row ${i + 1}`, cautions: standing(a) }))]
  const plate = groupCautions(posts)
  if (!plate) return null
  return <CautionPlate cautions={plate.lines.map((line) => ({ ...line, where: posts.length > 1 ? placeWords(line.where) : undefined }))} />
}

/** 'Found, rows 1, 2, 3'. */
function placeWords(where: readonly string[]): string {
  const rows = where.filter((w) => w.startsWith('row ')).map((w) => w.slice(4))
  return [...where.filter((w) => !w.startsWith('row ')), ...(rows.length ? [`${rows.length === 1 ? 'row' : 'rows'} ${rows.join(', ')}`] : [])].join(', ')
}

function headCells({ entry, kit, sections, tasks, system }: EntryPage) {
  const goingBy = entry.goingByThis + entry.answers.reduce((sum, a) => sum + a.goingByThis, 0)
  return [
    { label: 'Section', value: sections.map((s) => <a key={s.code} href={paths.section(kit.slug, s.code)} className="block"><b className="code">{s.code}</b> {s.title}</a>) },
    { label: 'Tasks', value: tasks.length ? tasks.map((t) => t.title).join(', ') : 'None named' },
    ...(entry.plans.length ? [{ label: 'Plans', value: entry.plans.map((p) => <span key={`${p.page}${p.step ?? ''}`} className="block"><PlansReference {...p} /></span>) }] : []),
    ...(system.length ? [{ label: 'System', value: system.map((s) => `${s.code} ${s.title.toLowerCase()}`).join(', ') + (entry.needsTwo || entry.answers.some((a) => a.needsTwo) ? ' · two stamps needed' : '') }] : []),
    ...(entry.hardware.length ? [{ label: 'Hardware', value: entry.hardware.join(', ') }] : []),
    { label: entry.kind === 'question' ? 'Builders going by a row' : 'Builders going by it', value: String(goingBy) },
  ]
}
