// What waits for me: bulletins on advice I go by. Closing one says that I have read it.
import type { Metadata } from 'next'
import Link from 'next/link'
import type { Route } from 'next'
import { CautionLine } from '@/components/cautions/caution-line'
import { PlanChanges } from '@/components/entries/plan-changes'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { memberContext } from '@/lib/auth/guards'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import type { Notice } from '@/lib/schemas/notices'
import { listNotices } from '@/lib/services/notices/list-notices'
import { closeNoticeAction } from './actions'

export const metadata: Metadata = { title: 'Waiting' }

export default async function WaitingPage() {
  const { items, nextCursor } = await listNotices(await memberContext(), { limit: 100 })
  return (
    <>
      <PageTitle title="Waiting" lead="What changed under advice you go by. Read it before you work on, then close it." />
      {items.length === 0
        ? <EmptyState title="Nothing waits for you" action={<LinkButton href={paths.home}>First page</LinkButton>}>When a bulletin changes a step under advice you go by, it stands here.</EmptyState>
        : <ul className="sheet divide-y divide-line">{items.map((n) => <li key={n.id} className="grid gap-3 px-5 py-4"><OneNotice notice={n} /></li>)}</ul>}
      {nextCursor === null ? null : <p>There are more. Close these first.</p>}
    </>
  )
}

function OneNotice({ notice: { id, kind, createdAt, post, bulletin } }: { notice: Notice }) {
  return (
    <>
      <p className="label">{kind === 'bulletin' && bulletin ? `Bulletin ${bulletin.number} of ${formatDate(bulletin.issuedOn)} · serials ${bulletin.serials}` : 'Advice withdrawn'} · told {formatDate(createdAt)}</p>
      <h2 className="text-heading"><Link href={post.url as Route}>{post.title}</Link></h2>
      <CautionLine cautions={post.cautions.filter((c) => !c.waived)} />
      {bulletin ? <><PlanChanges changes={bulletin.places} kit={bulletin.kit} brief /><p>{bulletin.summary}</p></> : null}
      <p className="text-small text-ink-soft">You go by advice under this. Stop at that step until you have the page in force and a mentor has looked again.</p>
      <FieldsForm action={closeNoticeAction} id={`close-${id}`} hidden={{ noticeId: id }} button="I have read it" fields={[]} about={post.title} />
    </>
  )
}
