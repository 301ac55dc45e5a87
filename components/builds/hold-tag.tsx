// A hold's tag for paper: cut out, punched, tied to the part. The code opens the hold; its address stands beside it for whoever has no camera.
import { placeWords } from '@/lib/format/build-words'
import { formatDate } from '@/lib/format/date'
import type { Hold } from '@/lib/schemas/builds'

export interface HoldTagProps {
  hold: Hold
  /** Absolute address of the hold. */
  address: string
  /** Dark modules as a path, in a square of `size` units. */
  code: { readonly size: number; readonly path: string }
  /** Who hung it up. */
  name: string
}

export function HoldTag({ hold, address, code, name }: HoldTagProps) {
  const isHold = hold.kind === 'hold'
  const lines = [['Section', `${hold.section.code} ${hold.section.title}`], ['Plans', placeWords(hold)], ['Until', hold.until], ['Go on with', hold.notWaiting]] as const
  return (
    <article className="hold-tag">
      <svg className="hold-tag-head" viewBox="0 0 200 30" aria-hidden="true" focusable="false">
        <path d="M.75 30V20L20 .75H180L199.25 20V30" /><circle cx="100" cy="15" r="10" /><circle cx="100" cy="15" r="4.5" strokeDasharray="2 2" />
      </svg>
      <h2 className={isHold ? 'hold-tag-word' : 'hold-tag-word hold-tag-open'}>{isHold ? 'Hold' : 'Left open'}</h2>
      <div className="hold-tag-body">
        <p className="hold-tag-what">{hold.what}</p>
        <dl>{lines.map(([label, value]) => (value ? <div key={label}><dt className="label">{label}</dt><dd>{label === 'Until' ? <b>{value}</b> : value}</dd></div> : null))}</dl>
      </div>
      <div className="hold-tag-foot">
        <div>
          <p>{name} · {formatDate(hold.createdAt)}</p>
          <p className="hold-tag-number">{hold.number}</p>
          <p>Take off only when the hold is released.</p>
          <a href={address}>{address}</a>
        </div>
        <svg className="hold-tag-code" viewBox={`-2 -2 ${code.size + 4} ${code.size + 4}`} shapeRendering="crispEdges" role="img" aria-label={`Code that opens ${hold.number}`}>
          <rect x="-2" y="-2" width={code.size + 4} height={code.size + 4} className="hold-tag-paper" /><path d={code.path} className="hold-tag-ink" />
        </svg>
      </div>
    </article>
  )
}
