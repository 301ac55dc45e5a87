// The head of a page: a label over the title ("Discrepancy sheet 214 · Whimbrel 2"), the title, a sentence, and an aside at the right.
import type { ReactNode } from 'react'

export interface PageTitleProps {
  title: string
  kicker?: string | undefined
  lead?: ReactNode
  aside?: ReactNode
}

export function PageTitle({ title, kicker, lead, aside }: PageTitleProps) {
  return (
    <div className="page-title">
      <div>
        {kicker ? <p className="label">{kicker}</p> : null}
        <h1>{title}</h1>
        {lead ? <p className="page-title-lead">{lead}</p> : null}
      </div>
      {aside ? <div className="page-title-aside">{aside}</div> : null}
    </div>
  )
}
