// A mentor's stamp on an entry: 176 px, 164 on a phone. Eyes get the drawing, screen readers one sentence that says the same.
import type { StampState } from '@/lib/domain/stamps/stamp-state'
import { basisLines } from '@/lib/format/basis'
import { formatStampDate } from '@/lib/format/date'
import { stampCondition, stampNote, stampSentence, type StampFace } from '@/lib/format/stamp-words'
import { StampFrame } from './stamp-frame'

export interface StampProps {
  stamp: StampFace
  /** The stamp state of the post it is on: it decides between live, lapsed, plans changed and in question. */
  state: StampState
}

export function StampOctagon({ stamp, state }: StampProps) {
  const condition = stampCondition(stamp, state)
  const note = stampNote(condition, stamp.bulletin)
  const [first, second] = basisLines(stamp.basis)
  const standing = condition === 'live' || condition === 'in-question'
  return (
    <div className={`stamp stamp-${condition}`}>
      <p className="sr-only">{stampSentence(stamp, condition)}</p>
      <div className="stamp-face" aria-hidden="true">
        <div className="stamp-octagon">
          <StampFrame shape="octagon" dashed={!standing} band />
          <span className="basis">{first}<br />{second}</span>
          <span className={stamp.mentor.mark.length > 7 ? 'mark mark-long' : 'mark'}>{stamp.mentor.mark}</span>
          <span className="foot">
            <span className="date block">{formatStampDate(stamp.createdAt)} · Rev {stamp.revision}</span>
            <span className="words block">Advice checked<br />work not inspected</span>
          </span>
          {condition === 'in-question' ? <span className="stamp-band">{note}</span> : null}
        </div>
      </div>
      {note && condition !== 'in-question' ? <span className="stamp-note" aria-hidden="true">{note}</span> : null}
    </div>
  )
}
