// Where there is nothing yet: what that means, and the next step.
import type { ReactNode } from 'react'

export interface EmptyStateProps {
  title: string
  children?: ReactNode
  /** The next step: one or two buttons. */
  action?: ReactNode
  level?: 2 | 3
}

export function EmptyState({ title, children, action, level = 2 }: EmptyStateProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return (
    <div className="empty-state">
      <Heading>{title}</Heading>
      {children ? <div>{children}</div> : null}
      {action ? <div className="button-row">{action}</div> : null}
    </div>
  )
}
