// All revisions of a post, each readable with its stamps, and what changed between two of them.
import type { Metadata } from 'next'
import Link from 'next/link'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { Prose } from '@/components/prose/prose'
import { StampFlat } from '@/components/stamps/stamp-flat'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { pageContext } from '@/lib/auth/guards'
import { formatDate } from '@/lib/format/date'
import { orNotFound } from '@/lib/http/or-not-found'
import { paths } from '@/lib/paths'
import { getRevisions } from '@/lib/services/entries/get-revisions'

export const metadata: Metadata = { title: 'Revisions' }

export default async function RevisionsPage({ params, searchParams }: PageProps<'/posts/[id]/revisions'>) {
  const context = await pageContext()
  const given = await searchParams
  const letter = (name: string) => { const v = given[name]; return typeof v === 'string' && v !== '' ? v : undefined }
  const page = await orNotFound((await params).id, (id) => getRevisions(context, id, { from: letter('from'), to: letter('to') }))
  return (
    <>
      <PageTitle title={page.title} kicker={page.kind === 'answer' ? 'Revisions of a row' : 'Revisions'} aside={<LinkButton href={paths.entry(page.entryId, page.postId)}>Back to the sheet</LinkButton>} />
      <CautionPlate cautions={page.cautions.filter((c) => !c.waived)} />
      {page.state === 'visible' ? null : <NoticeLine boxed><b>{page.state === 'withdrawn' ? 'Withdrawn: do not go by this.' : 'Hidden.'}</b></NoticeLine>}
      <Sheet as="section" labelledBy="all">
        <SheetHead title="All revisions" id="all" />
        <ol className="revision-list">
          {page.revisions.map((r, i) => (
            <li key={r.letter}>
              <span><b>Rev {r.letter}</b> · {r.author} · {formatDate(r.createdAt)}{i > 0 ? <> · <Link href={paths.revisions(page.postId, page.revisions[i - 1]?.letter, r.letter)}>what changed from Rev {page.revisions[i - 1]?.letter}</Link></> : null}</span>
              {r.stamps.map((s) => <StampFlat key={s.id} stamp={s} state={s.live ? page.stampState : 'lapsed'} />)}
            </li>
          ))}
        </ol>
      </Sheet>
      {page.from !== page.to ? (
        <Sheet as="section" labelledBy="changes">
          <SheetHead title={`Rev ${page.from} to Rev ${page.to}`} id="changes" note="added is underlined, taken out is struck" />
          <div className="sheet-body">
            {page.changes.length === 0 ? <p>Nothing differs.</p> : page.changes.map((c) => (
              <section key={c.label} className="change">
                <h3 className="label">{c.label}</h3>
                <p>{c.runs.map((r, i) => r.kind === 'added' ? <ins key={i}>{r.text}</ins> : r.kind === 'removed' ? <del key={i}>{r.text}</del> : <span key={i}>{r.text}</span>)}</p>
              </section>
            ))}
          </div>
        </Sheet>
      ) : null}
      <Sheet as="section" labelledBy="older">
        <SheetHead title={`Rev ${page.from} as it read`} id="older" />
        <div className="sheet-body"><Prose html={page.html} /></div>
      </Sheet>
    </>
  )
}
