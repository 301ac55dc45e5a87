// A brief on two sheets of paper: cautions and the order on the first; sizes, know-how, hours, tools and the closing list on the second.
// What does not fit is counted, since paper cannot be scrolled.
import { fitOrder, fitSecondPage } from './fit-brief'
import { BriefPlate } from './brief-plate'
import { CautionMention } from './caution-mention'
import { hoursWords } from '@/components/charts/hours-distribution'
import { builderWords, followedWords, sideWords, stepWords } from '@/lib/format/brief-order-words'
import { basisWords, capital } from '@/lib/format/shop-words'
import { formatDate } from '@/lib/format/date'
import type { Brief, BriefItem } from '@/lib/schemas/brief'

export function BriefPrint({ brief, address }: { brief: Brief, address: string }) {
  return (
    <>
      <FirstPage brief={brief} />
      <SecondPage brief={brief} />
      <p className="brief-paper-foot">
        <b>{brief.plansWin}</b> Check before use: {address}, as it stood on {formatDate(brief.preparedAt)}. Advice can be withdrawn and stamps can lapse.
      </p>
    </>
  )
}

function FirstPage({ brief }: { brief: Brief }) {
  const { order } = brief
  const { tasks, departures, disputes, leftOut } = fitOrder(brief)
  return (
    <section className="brief-paper-first" aria-label="Cautions and order">
      <BriefPlate brief={brief} />
      <h2>In this order</h2>
      <ol className="brief-paper-order">
        {tasks.map((task) => (
          <li key={task.slug}>
            <b>{capital(task.title)}</b> · {stepWords(task.steps) ?? (order.hasBaseLine ? 'not in the plans' : '')} <CautionMention cautions={task.cautions} />
          </li>
        ))}
      </ol>
      {departures.map((d) => <p key={`${d.before.slug} ${d.after.slug}`}>Off the plans: {builderWords(d.builders)} {d.before.title} before {d.after.title}.</p>)}
      {disputes.map((d) => <p key={d.tasks.map((t) => t.slug).join(' ')}><b>Builders disagree:</b> {d.sides.map(sideWords).join('; ')}. {followedWords(d)}</p>)}
      {leftOut > 0 ? <p>{leftOut} more tasks or remarks on the order stand on the page itself.</p> : null}
    </section>
  )
}

function SecondPage({ brief }: { brief: Brief }) {
  const { sizes, items, open, closing, tools, leftOut } = fitSecondPage(brief)
  return (
    <section className="brief-paper-second" aria-label="Sizes, know-how, lessons">
      {sizes.length > 0 ? <h2>Sizes</h2> : null}
      {sizes.map(({ size, task }) => (
        <p key={`${task} ${size.table} ${size.expected}`}>{capital(task)}: {size.claim} → <b className="code">{size.expected}</b> · {[basisWords(size).text, basisWords(size).source].filter(Boolean).join(', ')} <CautionMention cautions={size.cautions} /></p>
      ))}
      {items.length > 0 ? <h2>Know-how and lessons</h2> : null}
      {items.map(({ item, task, builders }) => (
        <div key={item.postId} className="brief-paper-item">
          <p><b>{capital(task)}: {item.title}</b> · {stampsOf(item)}{builders > 1 ? ` · ${builderWords(builders)} say so` : ''} <CautionMention cautions={item.cautions} /></p>
          {item.planChanges.length > 0 ? <p><b>Plans changed: bulletin {[...new Set(item.planChanges.map((c) => c.bulletin))].join(', ')}. Measure by the page in force.</b></p> : null}
          <p>{item.passage}</p>
        </div>
      ))}
      {open.length > 0 ? <><h2>Open</h2>{open.map((item) => <p key={item.postId}>{item.title} <CautionMention cautions={item.cautions} /></p>)}</> : null}
      {brief.hours || tools.length > 0 ? <h2>Hours and tools</h2> : null}
      {brief.hours ? <p>{hoursWords(brief.hours)}</p> : null}
      {tools.length > 0 ? <p>{tools.map((t) => t.name).join('; ')}.</p> : null}
      {closing.length > 0 ? <><h2>Before it is closed</h2><ul className="brief-paper-closing">{closing.map((line) => <li key={line.text}>{line.text}</li>)}</ul></> : null}
      {leftOut > 0 ? <p><b>{leftOut} more on the page itself.</b></p> : null}
    </section>
  )
}

/** 'Stamps HB 031, TR 017: advice checked, work not inspected'; what lies across a stamp on the page is said on paper too. */
function stampsOf({ stamp, stamps, missing }: BriefItem): string {
  if (stamp === 'in-question') return 'IN QUESTION: somebody told that it did not work. Its stamps do not count until a mentor looks again.'
  if (stamp === 'plans-changed') return 'PLANS CHANGED since it was stamped: read the bulletin first.'
  const live = stamps.filter((s) => s.live)
  if (live.length === 0) return 'No stamp.'
  return `${live.length === 1 ? 'Stamp' : 'Stamps'} ${live.map((s) => s.mentor.mark).join(', ')}: ADVICE CHECKED · WORK NOT INSPECTED.${missing === null ? '' : ' A stamp is missing.'}`
}
