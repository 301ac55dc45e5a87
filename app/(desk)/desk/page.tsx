// The mentors' desk: the rail of tags, and under it the one sheet that is open.
import type { Metadata } from 'next'
import Link from 'next/link'
import { DeskFilter } from '@/components/desk/desk-filter'
import { tagLabel, tagNote } from '@/components/desk/rail-words'
import { TagRail } from '@/components/entries/hung-tag'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { requireCan } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { getDesk, type Desk } from '@/lib/services/desk/get-desk'
import { listDeskChoices } from '@/lib/services/desk/list-desk-choices'
import { OpenSheet } from './_components/open-sheet'
import { readDeskAddress, type DeskAddress } from './_components/desk-address'

export const metadata: Metadata = { title: 'Desk' }

export default async function DeskPage({ searchParams }: PageProps<'/desk'>) {
  const context = await requireCan('desk.open')
  const address = readDeskAddress(await searchParams)
  const [kit, section] = address.section === undefined ? [] : address.section.split(':')
  const [desk, choices] = await Promise.all([getDesk(context, { open: address.open, operation: address.operation, kit, section }), listDeskChoices(context)])
  return (
    <>
      <PageTitle title="Desk" lead="What can hurt hangs first, then what most builders go by."
        aside={<><span className="block">You are <b className="code">{desk.mark}</b></span>{desk.waiting > 0 ? <span className="block">{desk.waiting} {desk.waiting === 1 ? 'tag' : 'tags'} off the rail, waiting for what you asked</span> : null}<Link className="block" href={paths.evidence}>Time to an answer</Link></>} />
      <DeskFilter action={paths.desk()} {...choices} section={address.section ?? ''} operation={address.operation ?? ''} />
      <Rail desk={desk} address={address} />
      {desk.open ? <OpenSheet sheet={desk.open} next={paths.desk({ ...address, open: desk.next ?? 0 })} closed={paths.desk({ ...address, open: 0 })} isHanging={desk.tags.some((t) => t.postId === desk.open?.post.id)} /> : <NothingOpen desk={desk} address={address} />}
    </>
  )
}

/** The tags and, where more hang than can be shown, how many. */
function Rail({ desk, address }: { desk: Desk; address: DeskAddress }) {
  if (desk.tags.length === 0) return null
  return (
    <>
      {desk.more > 0 ? <p className="text-small text-ink-soft">The first {desk.tags.length} hang here; {desk.more}{desk.isCut ? ' or more' : ''} more behind them.</p> : null}
      <TagRail label="Rail of tags" tags={desk.tags.map((tag) => ({
        label: tagLabel(tag), title: tag.title, note: tagNote(tag), code: tag.section, href: paths.desk({ ...address, open: tag.postId }),
        inQuestion: tag.reason === 'in-question', current: desk.open?.post.id === tag.postId,
      }))} />
    </>
  )
}

function NothingOpen({ desk, address }: { desk: Desk; address: DeskAddress }) {
  const isNarrowed = address.operation !== undefined || address.section !== undefined
  if (desk.tags.length > 0) {
    return <NoticeLine>{address.open ? 'That tag does not hang here any more. ' : ''}Take a tag off the rail to open its sheet.</NoticeLine>
  }
  return (
    <EmptyState title={isNarrowed ? 'Nothing hangs here with these filters' : 'The rail is empty'} action={isNarrowed ? <LinkButton href={paths.desk()}>Show the whole rail</LinkButton> : <LinkButton href={paths.search()}>Read what was written lately</LinkButton>}>
      <p>{isNarrowed ? 'Other operations and sections may have something for you.' : 'Everything that you may stamp is stamped, and every question has an answer.'}</p>
    </EmptyState>
  )
}
