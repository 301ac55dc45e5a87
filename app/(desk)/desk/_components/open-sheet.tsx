// The open sheet of the desk: the question at the left, the advice at the right, stamps and the empty place below, then what else a
// mentor can do with it. The whole text stays in view above the stamp.
import type { Route } from 'next'
import Link from 'next/link'
import { randomUUID } from 'node:crypto'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { AskForForm } from '@/components/desk/ask-for-form'
import { AskedForLine } from '@/components/desk/asked-for-line'
import { NumbersCheckList } from '@/components/entries/numbers-check-list'
import { RevisionLetter } from '@/components/entries/revision-letter'
import { Sheet } from '@/components/entries/sheet'
import { TitleBlock } from '@/components/entries/title-block'
import { PlansWin } from '@/components/layout/plans-win'
import { StampForm } from '@/components/stamps/stamp-form'
import { StampOctagon } from '@/components/stamps/stamp-octagon'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { askForAction, pressStampAction } from '@/app/(site)/stamp-actions'
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import { advisedConflicts } from '@/lib/domain/numbers-check/advised-conflicts'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import type { DeskSheet } from '@/lib/services/desk/load-sheet'
import { Advice, Found, standing, type Shown } from './sheet-text'

interface OpenSheetProps {
  sheet: DeskSheet
  /** The desk with the next tag open. */
  next: Route
  /** The desk with nothing open. */
  closed: Route
  /** Its tag hangs right above: they join. */
  isHanging: boolean
}

export function OpenSheet({ sheet, next, closed, isHanging }: OpenSheetProps) {
  const { entry, post, row } = sheet
  const kicker = [`${entry.kind === 'question' ? 'Discrepancy sheet' : 'Lesson'} ${entry.id}`, row === null ? '' : `row ${row}`, `Rev ${post.revision}`].filter(Boolean).join(' · ')
  return (
    <>
      <Sheet as="article" id="open-sheet" labelledBy="open-sheet-title" className={`border-2 border-ink ${isHanging ? '-mt-5' : ''}`}>
        <div className="flex flex-wrap items-center justify-between gap-4 border-b border-edge px-5 py-4">
          <div className="min-w-0">
            <p className="label">{kicker}</p>
            <h2 id="open-sheet-title" className="text-section"><Link href={paths.entry(entry.id, post.id)} className="text-ink no-underline hover:underline">{entry.title}</Link></h2>
          </div>
          <LinkButton href={closed}>Put back on the rail</LinkButton>
        </div>
        <SheetPlate sheet={sheet} />
        {row === null ? <Advice post={post} /> : (
          <div className="grid lg:grid-cols-[minmax(0,3fr)_minmax(0,5fr)]">
            <Found entry={entry} />
            <Advice post={post} />
          </div>
        )}
        {sheet.checks.length > 0 ? <div className="border-t border-line px-5 py-4"><NumbersCheckList posts={[{ label: '', checks: sheet.checks }]} kit={sheet.entry.kit} /></div> : null}
        <div className="grid border-t border-ink lg:grid-cols-[13rem_auto_minmax(0,1fr)]">
          <Facts sheet={sheet} />
          <Pressed post={post} />
          <StampPlace sheet={sheet} next={next} />
        </div>
        <Foot sheet={sheet} next={next} />
      </Sheet>
      <PlansWin maker={sheet.maker} />
    </>
  )
}

/** The one plate of the page: the cautions of what is open, with where each applies. In the sheet, which its tag hangs down to. */
function SheetPlate({ sheet: { entry, post, row } }: { sheet: DeskSheet }) {
  const own = { where: row === null ? 'this sheet' : `row ${row}`, cautions: standing(post) }
  const plate = groupCautions(row === null ? [own] : [{ where: 'Found', cautions: standing(entry) }, own])
  if (!plate) return null
  return <div className="px-5 pt-4"><CautionPlate cautions={plate.lines.map((line) => ({ ...line, where: row === null ? undefined : line.where.join(', ') }))} /></div>
}

/** By, revision, system, how many go by it: the title block, one cell under the other. */
function Facts({ sheet: { post, systems } }: { sheet: DeskSheet }) {
  const cells = [
    { label: 'By', value: post.author.id === undefined ? post.author.name : <Link href={paths.person(post.author.id)}>{post.author.name}</Link> },
    { label: 'Rev · date', value: <><RevisionLetter revision={post.revision} /> · {formatDate(post.updatedAt)}</> },
    { label: 'System', value: systems.length > 0 ? systems.join(', ') : 'None named' },
    ...(post.kind === 'question' ? [] : [{ label: 'Going by it', value: post.goingByThis === 1 ? '1 builder' : `${post.goingByThis} builders` }]),
  ]
  return <TitleBlock cells={cells.map((cell) => ({ ...cell, width: 'full' }))} />
}

/** The stamps that were pressed, those that lapsed included; withdrawn ones stand on the entry's own page. */
function Pressed({ post }: { post: Shown }) {
  const pressed = post.stamps.filter((s) => s.withdrawn === undefined)
  if (pressed.length === 0) return <div className="hidden lg:block" />
  return (
    <div className="grid content-start gap-3 border-line px-5 py-4 max-lg:border-t lg:border-l">
      <p className="label">{post.needsTwo ? 'Stamps so far' : 'Stamp so far'}</p>
      <div className="flex flex-wrap gap-3 lg:grid">{pressed.map((s) => <StampOctagon key={s.id} stamp={s} state={post.stamp} />)}</div>
    </div>
  )
}

/** The empty place with the form, or the next step where there is nothing to stamp. */
function StampPlace({ sheet: { entry, post, mayStamp, checks }, next }: { sheet: DeskSheet; next: Route }) {
  const frame = 'border-line px-5 py-4 max-lg:border-t lg:border-l'
  if (post.kind === 'question') return <div className={frame}><LinkButton href={paths.entry(entry.id)} look="primary">Say what to do</LinkButton></div>
  if (!mayStamp) return <div className={frame}><NoticeLine>{stampedWords(post)} <Link href={next}>Open the next tag</Link></NoticeLine></div>
  return (
    <div className={frame}>
      <StampForm action={pressStampAction} postId={post.id} revision={post.revision} missing={post.missing} single={!post.needsTwo} submission={randomUUID()} plans={entry.plans[0]} conflicts={advisedConflicts(checks)} returnTo={next} />
    </div>
  )
}

const stampedWords = (post: Shown) => ('makerReply' in post && post.makerReply === 'one-serial'
  ? 'A reply for one serial cannot be stamped: each builder asks for their own.'
  : 'There is nothing here for you to stamp: these are your words, or your stamp stands.')

function Foot({ sheet: { entry, post, mayAsk, requests }, next }: { sheet: DeskSheet; next: Route }) {
  return (
    <div className="grid gap-4 border-t border-line px-5 py-4">
      <AskedForLine requests={requests} />
      <div className="flex flex-wrap items-center justify-between gap-4">
        {mayAsk ? <AskForForm action={askForAction} postId={post.id} returnTo={next} asked={requests} /> : null}
        <LinkButton href={paths.entry(entry.id, post.id)}>Write what is wrong</LinkButton>
      </div>
    </div>
  )
}
