// Where in the kit maker's plans something stands: 'Page W3-2 · step 6 · Rev C'. Page codes don't wrap; never the plans' own text.
import { Fragment } from 'react'

export interface PlansReferenceProps {
  page: string
  step?: string | number | null | undefined
  revision?: string | null | undefined
}

export function PlansReference({ page, step, revision }: PlansReferenceProps) {
  const parts = [`Page ${page}`, step === null || step === undefined || step === '' ? null : `step ${step}`, revision ? `Rev ${revision}` : null]
  return (
    <>
      {parts.filter((part) => part !== null).map((part, index) => (
        <Fragment key={part}>{index > 0 ? ' · ' : null}<span className="whole">{part}</span></Fragment>
      ))}
    </>
  )
}
