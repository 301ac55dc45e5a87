// The search line as a plain form, which works before and without JavaScript. A client version keeps this markup and adds to it.
import type { Route } from 'next'
import type { ReactNode } from 'react'
import { Icon } from '@/components/ui/icon'

export interface SearchFormProps {
  /** The results page; the words go to it as `q`. */
  action: Route
  defaultValue?: string
  /** Hidden fields to keep, such as the chosen kit. */
  children?: ReactNode
}

export function SearchForm({ action, defaultValue = '', children }: SearchFormProps) {
  return (
    <form className="search-form" role="search" action={action} method="get">
      <Icon name="search" />
      <input className="control" type="search" name="q" aria-label="Search" placeholder="Part, task, size: anything you know" defaultValue={defaultValue} maxLength={500} autoComplete="off" enterKeyHint="search" aria-keyshortcuts="/" />
      <kbd aria-hidden="true">/</kbd>
      {children}
    </form>
  )
}
