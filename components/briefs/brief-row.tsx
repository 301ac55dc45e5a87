// One row at a task: what it is at the left, what it says, and its stamps at the right.
import type { ReactNode } from 'react'

export function BriefRow({ label, aside, children }: { label: string, aside?: ReactNode, children: ReactNode }) {
  return (
    <div className="brief-row">
      <p className="label">{label}</p>
      <div className="brief-row-text">{children}</div>
      {aside ? <div className="brief-row-aside">{aside}</div> : null}
    </div>
  )
}
