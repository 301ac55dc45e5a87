// The stamp in lists: 274 × 58 px, never under 256 wide. It says what the octagon says but for the date, which the sentence carries.
import { basisLines } from '@/lib/format/basis'
import { stampCondition, stampNote, stampSentence } from '@/lib/format/stamp-words'
import { StampFrame } from './stamp-frame'
import type { StampProps } from './stamp-octagon'

export function StampFlat({ stamp, state }: StampProps) {
  const condition = stampCondition(stamp, state)
  const note = stampNote(condition, stamp.bulletin)
  const line = `${basisLines(stamp.basis).join(' ')} · ${stamp.mentor.mark} · Rev ${stamp.revision}`
  const standing = condition === 'live' || condition === 'in-question'
  return (
    <div className={`stamp stamp-flat-box stamp-${condition}`}>
      <p className="sr-only">{stampSentence(stamp, condition)}</p>
      <div aria-hidden="true">
        <div className="stamp-flat">
          <StampFrame shape="flat" dashed={!standing} />
          <span className={line.length > 33 ? 'line line-long' : 'line'}>{line}</span>
          <span className="words">Advice checked · work not inspected</span>
        </div>
        {note ? <span className={condition === 'in-question' ? 'stamp-note stamp-note-band' : 'stamp-note'}>{note}</span> : null}
      </div>
    </div>
  )
}
