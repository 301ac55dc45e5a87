// What a builder goes by, each with its cautions and with what became of it since. Nothing is judged here.
import type { Route } from 'next'
import Link from 'next/link'
import { CautionLine } from '@/components/cautions/caution-line'
import type { GoneBy } from '@/lib/schemas/builds'

export function GoneByList({ items }: { items: readonly GoneBy[] }) {
  return (
    <ul className="sheet">
      {items.map((item) => (
        <li key={item.postId}>
          <article className="hit">
            <div className="hit-text">
              <p className="label">{item.kind === 'lesson' ? 'Lesson' : 'What to do'} · {item.author} · {item.sections.join(', ')} · you go by Rev {item.revision}</p>
              <h3><Link href={item.url as Route}>{item.title}</Link></h3>
              <CautionLine cautions={item.cautions.filter((c) => !c.waived)} />
              {news(item).map((sentence) => <p key={sentence}><b>{sentence}</b></p>)}
            </div>
          </article>
        </li>
      ))}
    </ul>
  )
}

/** What a builder has to know before going on. */
function news(item: GoneBy): string[] {
  return [
    item.state === 'withdrawn' ? 'Withdrawn: do not go by this. Open it for what to inspect.' : '',
    item.revision === item.currentRevision ? '' : `It is Rev ${item.currentRevision} now: read it again.`,
    item.stamp === 'in-question' ? 'In question: it did not work for a builder, a mentor has to look again.' : '',
    item.stamp === 'plans-changed' ? 'The plans changed since it was stamped.' : item.plansChanged ? 'The plans changed since it was written.' : '',
  ].filter(Boolean)
}
