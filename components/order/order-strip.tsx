// The order strip: tasks as holes along a sheet's edge, the plans' steps as its base line, departures in lanes at the left, a cut where builders
// disagree. Drawn by the style sheet row by row, so that it needs no script and prints; the words beside it say the same. What stands at a task is given.
import { Fragment, type ReactNode } from 'react'
import { layStrip, type LanePart, type StripLine } from '@/lib/domain/order/lay-strip'

/** `isInPlans`: its hole lies on the base line, not beside it. */
export interface StripTask { slug: string; isInPlans: boolean }
export interface StripDispute { tasks: readonly string[]; counts: readonly number[]; body: ReactNode }

export interface OrderStripProps {
  tasks: readonly StripTask[]
  departures: readonly StripLine[]
  /** Of two tasks that follow one another: how many go straight on. */
  straightOn?: readonly StripLine[]
  disputes?: readonly StripDispute[]
  bodyOf: (slug: string) => ReactNode
}

/** Lanes beyond these are told in words only. */
const mostLanes = 3

export function OrderStrip({ tasks, departures, straightOn = [], disputes = [], bodyOf }: OrderStripProps) {
  const order = tasks.map((t) => t.slug)
  const rows = layStrip(order, departures)
  const placeOf = ({ tasks: of }: StripDispute) => Math.max(...of.map((slug) => order.indexOf(slug)))
  return (
    <ol className="strip">
      {rows.map(({ task, lanes }, row) => (
        <Fragment key={task}>
          {disputes.filter((d) => placeOf(d) === row).map((d) => (
            <li key={d.tasks.join(' ')} className="strip-row strip-dispute">
              <Rail lanes={lanes.map((part) => (part === 'start' ? 'none' : part === 'none' ? 'none' : 'through'))}><FacingArrows counts={d.counts} /></Rail>
              <div className="strip-body">{d.body}</div>
            </li>
          ))}
          <li className={`strip-row${tasks[row]?.isInPlans ? '' : ' strip-off'}`}>
            <Rail lanes={lanes} counts={countsAt(departures, task)}>
              <span className="strip-hole" />
              {straightOn.filter((line) => line.before === task).map((line) => <b key={line.after} className="strip-straight">{line.builders}</b>)}
            </Rail>
            <div className="strip-body">{bodyOf(task)}</div>
          </li>
        </Fragment>
      ))}
    </ol>
  )
}

const countsAt = (departures: readonly StripLine[], task: string) => departures.filter((d) => d.before === task).map((d) => d.builders)

function Rail({ lanes, counts = [], children }: { lanes: readonly LanePart[], counts?: readonly number[], children: ReactNode }) {
  const starting = lanes.slice(0, mostLanes).filter((part) => part === 'start').length
  return (
    <div className="strip-rail" aria-hidden="true">
      <span className="strip-line" />
      {lanes.slice(0, mostLanes).map((part, lane) => (part === 'none' ? null : <span key={lane} className={`strip-lane strip-lane-${lane} strip-lane-${part}`} />))}
      {starting > 0 ? <b className="strip-count">{counts.slice(0, starting).join(' · ')}</b> : null}
      {children}
    </div>
  )
}

/** Two arrows facing one another, each with how many stand behind it. */
function FacingArrows({ counts: [one = 0, other = 0] }: { counts: readonly number[] }) {
  return (
    <svg className="strip-facing" viewBox="0 0 44 76" width="44" height="76" focusable="false">
      <path d="M31 4v20" stroke="currentColor" strokeWidth="2" /><path d="M25 22h12l-6 11Z" fill="currentColor" />
      <path d="M20 38h22" stroke="currentColor" strokeWidth="1.5" />
      <path d="M31 72V52" stroke="currentColor" strokeWidth="2" /><path d="M25 54h12l-6-11Z" fill="currentColor" />
      <text x="14" y="26" textAnchor="end">{one}</text><text x="14" y="62" textAnchor="end">{other}</text>
    </svg>
  )
}
