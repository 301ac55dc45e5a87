// The shape of navigation: the page decides which items there are, header, bottom bar and footer only draw them.
import type { Route } from 'next'
import type { IconName } from '@/components/ui/icon'

export interface NavItem {
  readonly href: Route
  readonly label: string
}

export interface BarItem extends NavItem {
  readonly icon: IconName
}
