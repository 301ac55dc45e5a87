// A lesson: its parts one below the other on one sheet, order advice, and the title block with its stamps.
import { CautionLine } from '@/components/cautions/caution-line'
import { NumbersCheckSheet } from '@/components/entries/numbers-check-list'
import { Sheet } from '@/components/entries/sheet'
import { Prose } from '@/components/prose/prose'
import type { EntryPage } from '@/lib/services/entries/get-entry-page'
import { WaivedCautions } from './answer-row'
import { OrderAdvice } from './order-advice'
import { PostActs, PostOutcomes, PostStateNotice, PostTitleBlock } from './post-foot'

export function LessonSheet({ page, allCautions }: { page: EntryPage; allCautions: { code: string; title: string }[] }) {
  const { entry, rights, parts } = page
  const own = rights.get(entry.id)
  if (!own) return null
  const hours = entry.parts?.['hours']
  return (
    <>
    <Sheet as="article" id={`post-${entry.id}`} className="lesson">
      <div className="sheet-body">
        <PostStateNotice post={entry} rights={own} />
        <CautionLine cautions={entry.cautions.filter((c) => !c.waived)} />
        <WaivedCautions post={entry} />
        {parts.map((p) => (
          <section key={p.name} className="lesson-part">
            {p.label ? <h2>{p.label}</h2> : null}
            <Prose html={p.html} />
          </section>
        ))}
        <OrderAdvice advice={entry.orderAdvice} titles={page.adviceTitles} />
        <PostOutcomes post={entry} />
      </div>
      <PostTitleBlock post={entry} extra={typeof hours === 'number' ? [{ label: 'Hours', value: String(hours), width: 'half' }] : []} />
      <PostActs post={entry} rights={own} allCautions={allCautions} plans={entry.plans[0]} similar={page.otherCases} />
    </Sheet>
    <NumbersCheckSheet posts={[{ label: 'Lesson', checks: own.checks }]} kit={entry.kit} />
    </>
  )
}
