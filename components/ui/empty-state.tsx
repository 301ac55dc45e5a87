// Where there is nothing yet: what that means, and the next step.
import type { ReactNode } from 'react'

export interface EmptyStateProps {
  title: string
  children?: ReactNode
  /** The next step: one or two buttons. */
  action?: ReactNode
  /** 1 where it is the whole page. */
  level?: 1 | 2 | 3
}

export function EmptyState({ title, children, action, level = 2 }: EmptyStateProps) {
  const Heading = `h${level}` as const
  return (
    <div className="empty-state">
      <Heading>{title}</Heading>
      {children ? <div>{children}</div> : null}
      {action ? <div className="button-row">{action}</div> : null}
    </div>
  )
}
