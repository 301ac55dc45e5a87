// One row of What to do: number, caution line, text, how it went, title block with its stamps, acts.
import { CautionLine } from '@/components/cautions/caution-line'
import { PlanChanges } from '@/components/entries/plan-changes'
import { SheetRow } from '@/components/entries/sheet'
import { Prose } from '@/components/prose/prose'
import type { Answer, Entry } from '@/lib/schemas/post'
import type { PostRights } from '@/lib/services/entries/get-entry-page'
import { PostActs, PostOutcomes, PostStateNotice, PostTitleBlock } from './post-foot'

export function AnswerRow({ answer, kit, number, rights, allCautions, plans }: { answer: Answer; kit: string; number: number; rights: PostRights; allCautions: { code: string; title: string }[]; plans: Entry['plans'][number] | undefined }) {
  return (
    <article className="sheet answer" id={`post-${answer.id}`} aria-label={`Row ${number}, by ${answer.author.name}`} tabIndex={-1}>
      <SheetRow number={number}>
        <PostStateNotice post={answer} rights={rights} />
        <CautionLine cautions={answer.cautions.filter((c) => !c.waived)} wide />
        <WaivedCautions post={answer} />
        <PlanChanges changes={answer.planChanges} kit={kit} />
        <Prose html={answer.html} />
        <PostOutcomes post={answer} />
      </SheetRow>
      <PostTitleBlock post={answer} />
      <PostActs post={answer} rights={rights} allCautions={allCautions} plans={plans} />
    </article>
  )
}

/** A waived caution stays readable, with its reason. */
export function WaivedCautions({ post }: { post: Pick<Answer, 'cautions'> }) {
  const waived = post.cautions.filter((c) => c.waived)
  if (waived.length === 0) return null
  return <p className="text-small">{waived.map((c) => `${c.title}: waived by a moderator. ${c.waived?.reason ?? ''}`).join(' ')}</p>
}
