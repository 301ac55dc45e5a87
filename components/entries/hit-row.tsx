// One search hit: what it is, its title, its cautions, the passage found, tags, how it went, and its stamps flat at the right
// (below everything on a phone).
import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { CautionLine, type LineCaution } from '@/components/cautions/caution-line'
import { BalloonNumber } from '@/components/shop/figure-balloon'
import { StampFlat } from '@/components/stamps/stamp-flat'
import type { StampState } from '@/lib/domain/stamps/stamp-state'
import type { StampFace } from '@/lib/format/stamp-words'
import { orderWords, type ShownAdvice } from '@/lib/format/order-words'
import { HowItWent, type HowItWentProps } from './how-it-went'
import { MarkedSnippet } from './marked-snippet'
import { PartTags, type PartTagProps } from './part-tag'

export interface HitRowProps {
  /** 'Lesson · Dela Whitcombe · Rev B'; set in capitals by the style. */
  kindLine: string
  title: string
  href: Route
  cautions: readonly LineCaution[]
  snippet: string
  marks: readonly (readonly [number, number])[]
  /** Its advice on the order that was asked for. */
  orderAdvice?: readonly ShownAdvice[] | undefined
  partTags: readonly PartTagProps[]
  outcomes?: HowItWentProps['outcomes'] | undefined
  /** The passage is on a critical system. */
  critical: boolean
  stamps: readonly (StampFace & { readonly id: number | string })[]
  stampState: StampState
  /** Balloons of the drawing above that the passage speaks of, with the names of their features. */
  balloons?: readonly { readonly n: number; readonly label: string }[] | undefined
  /** To be jumped to from elsewhere on the page. */
  anchor?: string | undefined
  /** A next step in the row, such as a link button Tell what to do. */
  action?: ReactNode
}

export function HitRow({ kindLine, title, href, cautions, snippet, marks, orderAdvice, partTags, outcomes, critical, stamps, stampState, balloons = [], anchor, action }: HitRowProps) {
  return (
    <article className={balloons.length > 0 ? 'hit hit-keyed' : 'hit'} id={anchor}>
      {balloons.length > 0 ? <div className="hit-balloons">{balloons.map(({ n, label }) => <BalloonNumber key={n} n={n} label={`About ${n}, ${midSentence(label)}`} />)}</div> : null}
      <div className="hit-text">
        <p className="label">{kindLine}</p>
        <h3><Link href={href}>{title}</Link></h3>
        <CautionLine cautions={cautions} />
        {orderAdvice ? <p className="hit-order"><span className="label">Order advice</span> <b>{orderWords(orderAdvice)}</b></p> : null}
        <p className="hit-snippet"><MarkedSnippet text={snippet} marks={marks} /></p>
        <div className="hit-foot">
          <PartTags items={partTags} />
          {outcomes ? <HowItWent outcomes={outcomes} critical={critical} /> : null}
          {action}
        </div>
      </div>
      {stamps.length > 0 ? (
        <div className="hit-stamps">{stamps.map((stamp) => <StampFlat key={stamp.id} stamp={stamp} state={stampState} />)}</div>
      ) : null}
    </article>
  )
}

/** "the groove", but "E, 1/4" and "#30" stay as they are. */
function midSentence(label: string): string {
  return /^[A-Z][a-z]/.test(label) ? `the ${label.charAt(0).toLowerCase()}${label.slice(1)}` : label
}
