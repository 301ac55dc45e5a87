// A quiet line with an icon; boxed when it answers something the reader just did ("Sent. A mentor will look at it.").
import type { ReactNode } from 'react'
import { Icon, type IconName } from './icon'

export interface NoticeLineProps {
  icon?: IconName
  boxed?: boolean
  /** Announced when it appears. */
  live?: boolean
  children: ReactNode
}

export function NoticeLine({ icon = 'attention', boxed = false, live = false, children }: NoticeLineProps) {
  return (
    <div className={boxed ? 'notice-line notice-line-boxed' : 'notice-line'} role={live ? 'status' : undefined}>
      <Icon name={icon} size={20} />
      <div>{children}</div>
    </div>
  )
}
