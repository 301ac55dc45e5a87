// A hold as a manila tag: what not to go past, until what, and what need not wait; or what is left open on purpose, and until which section.
import type { ReactNode } from 'react'
import { placeWords } from '@/lib/format/build-words'
import { formatDate } from '@/lib/format/date'
import type { Hold } from '@/lib/schemas/builds'

export interface HoldCardProps {
  hold: Hold
  /** Shown where holds of several sections stand together. */
  withSection?: boolean
  level?: 2 | 3
  /** What can be done: release, print the tag. */
  children?: ReactNode
}

export function HoldCard({ hold, withSection = false, level = 3, children }: HoldCardProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  const place = placeWords(hold)
  return (
    <article className={hold.released ? 'hold-card hold-card-released' : 'hold-card'} id={`hold-${hold.id}`}>
      <span className="hold-card-hole" aria-hidden="true" />
      <p className="hold-card-word"><b>{hold.released ? 'Released' : hold.kind === 'hold' ? 'Hold' : 'Left open'}</b> <span className="code">{hold.number}</span></p>
      <Heading>{hold.what}</Heading>
      <dl>
        {withSection ? <Line label="Section">{hold.section.code} {hold.section.title}</Line> : null}
        {place ? <Line label="Plans">{place}</Line> : null}
        <Line label="Until"><b>{hold.until}</b></Line>
        {hold.notWaiting ? <Line label="Go on with">{hold.notWaiting}</Line> : null}
        <Line label="Since">{formatDate(hold.createdAt)}</Line>
        {hold.released ? <Line label="Released">{formatDate(hold.released.at)}: {hold.released.note}</Line> : null}
      </dl>
      {children ? <div className="hold-card-acts">{children}</div> : null}
    </article>
  )
}

function Line({ label, children }: { label: string; children: ReactNode }) {
  return <div><dt className="label">{label}</dt><dd>{children}</dd></div>
}
