'use client'
// The search line of every page. A plain form until it is first focused; then the live results load (TanStack Query comes with them).
import type { Route } from 'next'
import dynamic from 'next/dynamic'
import { usePathname, useSearchParams } from 'next/navigation'
import { useEffect, useRef, useState } from 'react'
import { Icon } from '@/components/ui/icon'

const LiveSearch = dynamic(() => import('./live-search'), { ssr: false })

export function SearchLine({ action }: { action: Route }) {
  const onResults = usePathname() === action
  const given = useSearchParams().get('q') ?? ''
  const shown = onResults ? given : ''
  return <Line key={shown} action={action} shown={shown} />
}

function Line({ action, shown }: { action: Route; shown: string }) {
  const input = useRef<HTMLInputElement>(null)
  const [isAwake, setAwake] = useState(false)
  useEffect(() => focusOnSlash(input), [])
  return (
    <form className="search-form" role="search" action={action} method="get" onFocus={() => setAwake(true)}>
      <Icon name="search" />
      {isAwake ? <LiveSearch input={input} shown={shown} results={action} /> : null}
      <input ref={input} className="control" type="search" name="q" aria-label="Search" placeholder="Part, task, size: anything you know" defaultValue={shown} maxLength={500} autoComplete="off" enterKeyHint="search" aria-keyshortcuts="/" />
      <kbd aria-hidden="true">/</kbd>
    </form>
  )
}

/** `/` goes to the search line, unless somebody is typing. */
function focusOnSlash(input: { current: HTMLInputElement | null }): () => void {
  const listener = (event: KeyboardEvent) => {
    const target = event.target
    const isTyping = target instanceof HTMLElement && (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
    if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isTyping) return
    event.preventDefault()
    input.current?.focus()
    input.current?.select()
  }
  document.addEventListener('keydown', listener)
  return () => document.removeEventListener('keydown', listener)
}
