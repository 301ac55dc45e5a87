// What stands below a post's text: how it went, title block with stamps, what one may do, remarks.
import Link from 'next/link'
import { randomUUID } from 'node:crypto'
import type { ReactNode } from 'react'
import { HowItWent } from '@/components/entries/how-it-went'
import { OutcomeForm } from '@/components/entries/outcome-form'
import { RelianceForm } from '@/components/entries/reliance-form'
import { TitleBlock, type TitleBlockCell } from '@/components/entries/title-block'
import { AskedForLine } from '@/components/desk/asked-for-line'
import { ModerationPanel, type Duplicate } from '@/components/moderation/moderation-panel'
import { StampForm } from '@/components/stamps/stamp-form'
import { StampRow, stampCount } from '@/components/stamps/stamp-row'
import { WithdrawStampForm } from '@/components/stamps/withdraw-stamp-form'
import { Disclosure } from '@/components/ui/disclosure'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { advisedConflicts } from '@/lib/domain/numbers-check/advised-conflicts'
import { basisLabel, scopeLabel } from '@/lib/format/basis'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import type { Answer, Entry } from '@/lib/schemas/post'
import type { Hit } from '@/lib/schemas/search'
import type { PostRights } from '@/lib/services/entries/get-entry-page'
import { addCautionAction, mergeEntryAction, setStateAction, waiveCautionAction } from '@/app/(site)/moderation-actions'
import { pressStampAction, withdrawStampAction } from '@/app/(site)/stamp-actions'
import { outcomeAction, relianceAction } from '../../actions'
import { Remarks } from './remarks'

type Shown = Entry | Answer

/** The stamps' reasons in words: basis, reference, and why a conflict was accepted. */
function basisWords(post: Shown): ReactNode {
  const live = post.stamps.filter((s) => s.live && !s.withdrawn)
  if ('makerReply' in post && post.makerReply === 'one-serial') return 'Kit maker’s written reply · one serial only · cannot be stamped or gone by'
  if (live.length === 0) return post.needsTwo ? 'None given. Needs two stamps, by two people who did not write it.' : 'None given.'
  return (
    <>
      {live.map((s) => <span key={s.id} className="block">{basisLabel(s.basis)}{s.scope ? `, ${scopeLabel(s.scope)}` : ''}: {s.reference}{s.plansRevision ? ` Rev ${s.plansRevision}` : ''}{s.conflictReason ? ` · ${s.conflictReason}` : ''}</span>)}
      {post.missing === 'second' ? <span className="block">One stamp. Needs two, by two people who did not write it.</span> : null}
      {post.missing === 'firm-basis' ? <span className="block">One of the two has to stand on a plans step, a published standard or a maker’s general reply.</span> : null}
    </>
  )
}

export function PostTitleBlock({ post, extra = [] }: { post: Shown; extra?: TitleBlockCell[] }) {
  const isQuestion = post.kind === 'question'
  const cells: TitleBlockCell[] = [
    ...extra,
    { label: 'By', value: post.author.id === undefined ? post.author.name : <Link href={paths.person(post.author.id)}>{post.author.name}</Link>, width: 'full' },
    { label: 'Rev', value: post.revisions.length > 1 ? <Link href={paths.revisions(post.id)}>{post.revision}</Link> : post.revision, width: 'half' },
    { label: 'Date', value: formatDate(post.updatedAt), width: 'half' },
    ...(isQuestion ? [] : [{ label: 'Basis', value: basisWords(post), width: 'full' as const }]),
  ]
  const isUnstampable = isQuestion || ('makerReply' in post && post.makerReply === 'one-serial')
  const shown = post.stamps.filter((s) => !s.withdrawn)
  return <TitleBlock cells={cells} {...(isUnstampable ? {} : { stamps: { label: stampCount({ stamps: shown, needsTwo: post.needsTwo }), content: <StampRow stamps={post.stamps} state={post.stamp} needsTwo={post.needsTwo} missing={post.missing} /> } })} />
}

export function PostOutcomes({ post }: { post: Shown }) {
  if (post.outcomes.items.length === 0) return null
  const older = post.outcomes.items.filter((o) => o.revision !== post.revision)
  const now = { ...post.outcomes, items: post.outcomes.items.filter((o) => o.revision === post.revision) }
  return (
    <div className="post-outcomes">
      {now.items.length > 0 ? <HowItWent outcomes={now} critical={post.needsTwo} notes /> : null}
      {older.length > 0 ? <p className="text-small">{older.length} more on an older revision: {[...new Set(older.map((o) => `Rev ${o.revision}`))].join(', ')}.</p> : null}
      <Disclosure summary={`What they wrote (${post.outcomes.items.length})`} look="quiet" small>
        <ul className="outcome-list">
          {post.outcomes.items.map((o) => (
            <li key={`${o.author.name}${o.createdAt}`}><b>{outcomeWords[o.result]}</b> · {o.author.name} · {formatDate(o.createdAt)} · on Rev {o.revision}{o.note ? <>: {o.note}</> : null}</li>
          ))}
        </ul>
      </Disclosure>
    </div>
  )
}
const outcomeWords = { 'as-written': 'As written', 'with-change': 'With a change', 'did-not-work': 'Did not work' } as const

/** The row of acts. Nothing is disabled: what one may not do is not there. */
export function PostActs({ post, rights, allCautions, plans, similar = [] }: { post: Shown; rights: PostRights; allCautions: { code: string; title: string }[]; plans: Entry['plans'][number] | undefined; similar?: readonly Hit[] }) {
  const isOneSerial = 'makerReply' in post && post.makerReply === 'one-serial'
  const older = post.revisions.at(-2)
  return (
    <>
      <AskedForLine requests={rights.askedFor} />
      <div className="sheet-foot post-acts no-print">
        {isOneSerial ? <LinkButton href={paths.ask()} look="primary">Ask for your own</LinkButton> : null}
        {rights.goBy ? <RelianceForm action={relianceAction} postId={post.id} revision={post.revision} goesBy={rights.goesBy} /> : null}
        {rights.edit ? <LinkButton href={post.kind === 'answer' ? paths.editAnswer(post.id) : paths.editEntry(post.id)}>Edit</LinkButton> : null}
        {older ? <LinkButton href={paths.revisions(post.id, older.revision, post.revision)} look="quiet">Read Rev {older.revision}</LinkButton> : null}
        {rights.tell ? <Disclosure summary={rights.told ? 'Change how it went' : 'Tell how it went'}><OutcomeForm action={outcomeAction} postId={post.id} revision={post.revision} critical={post.needsTwo} told={rights.told} /></Disclosure> : null}
        {rights.stamp && (rights.ownStampId === null || post.stamp === 'in-question') ? <Disclosure summary={`Stamp Rev ${post.revision}`}><StampForm action={pressStampAction} postId={post.id} revision={post.revision} missing={post.missing} single={!post.needsTwo} plans={plans} conflicts={advisedConflicts(rights.checks)} submission={randomUUID()} /></Disclosure> : null}
        {rights.ownStampId !== null ? <Disclosure summary="Withdraw my stamp" look="quiet"><WithdrawStampForm action={withdrawStampAction} stampId={rights.ownStampId} /></Disclosure> : null}
        {rights.cautions ? <Disclosure summary="Moderate" look="quiet"><ModerationPanel postId={post.id} state={post.state} cautions={post.cautions} allCautions={allCautions} duplicates={duplicatesOf(post, similar)} mergeAction={mergeEntryAction} addCautionAction={addCautionAction} waiveCautionAction={waiveCautionAction} setStateAction={setStateAction} /></Disclosure> : null}
      </div>
      <Remarks post={post} mayRemark={rights.remark} memberId={rights.memberId} />
    </>
  )
}

/** What a duplicate could be merged into. */
function duplicatesOf(post: Shown, similar: readonly Hit[]): Duplicate[] {
  if (post.kind === 'answer' || ('answers' in post && post.answers.some((a) => a.state === 'visible'))) return []
  return similar.filter((hit) => hit.kind === post.kind).map((hit) => ({ id: hit.id, title: hit.title, caution: hit.cautions.find((c) => !c.waived) ?? null }))
}

/** Says that a post is hidden, merged or withdrawn, to those who still see it. */
export function PostStateNotice({ post, rights }: { post: Shown; rights: PostRights }) {
  if (post.state === 'visible') return null
  return <NoticeLine boxed><b>{stateWords[post.state]}</b> {rights.stateReason ?? ''}</NoticeLine>
}

const stateWords = { visible: '', hidden: 'Hidden.', merged: 'Merged into another entry: others are led there.', withdrawn: 'Withdrawn: do not go by this.' } as const
