'use client'
// Results while typing, under the search line: an ARIA combobox whose options are links. Loaded at the first focus.
import { QueryClient, QueryClientProvider, keepPreviousData, useQuery } from '@tanstack/react-query'
import type { Route } from 'next'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useEffect, useMemo, useState, useSyncExternalStore, type RefObject } from 'react'
import { CautionWord, gravestWord } from '@/components/cautions/caution-word'
import { MarkedSnippet } from '@/components/entries/marked-snippet'
import { liveResults } from '@/lib/client/queries'
import { useRested } from '@/lib/client/use-rested'
import { hitKindLine } from '@/lib/format/kind-line'
import type { Hit } from '@/lib/schemas/search'

interface Props { input: RefObject<HTMLInputElement | null>; shown: string; results: Route }
const client = new QueryClient({ defaultOptions: { queries: { retry: 1, refetchOnWindowFocus: false } } })
const listId = 'live-results'

export default function LiveSearch(props: Props) {
  return <QueryClientProvider client={client}><Results {...props} /></QueryClientProvider>
}

function Results({ input, shown, results }: Props) {
  const router = useRouter()
  const typed = useTyped(input)
  // Closed for one text; typing on opens it again.
  const [closedFor, setClosedFor] = useState<string | null>(null)
  const close = () => setClosedFor(typed)
  const [active, setActive] = useState(-1)
  const words = useRested(typed, 150)
  const { data, error, isFetching } = useQuery({ ...liveResults(words), placeholderData: keepPreviousData })
  const hits = useMemo(() => (words.trim() === '' ? [] : (data?.results ?? [])), [words, data])
  const isShown = closedFor !== typed && typed.trim() !== '' && typed !== shown

  useEffect(() => {
    const field = input.current
    if (!field) return
    const onInput = () => { setClosedFor(null); setActive(-1) }
    const onKey = (event: KeyboardEvent) => {
      if (event.key === 'Escape' && isShown) { event.preventDefault(); setClosedFor(field.value) }
      if ((event.key === 'ArrowDown' || event.key === 'ArrowUp') && hits.length > 0) {
        event.preventDefault()
        setClosedFor(null)
        setActive((now) => (now + (event.key === 'ArrowDown' ? 1 : hits.length + (now < 0 ? 1 : 0) - 1)) % hits.length)
      }
      const chosen = hits[active]
      if (event.key === 'Enter' && isShown && chosen) { event.preventDefault(); setClosedFor(field.value); router.push(chosen.url as Route) }
    }
    const onBlur = (event: FocusEvent) => {
      const next = event.relatedTarget
      if (!(next instanceof Element) || !next.closest(`#${listId}`)) setClosedFor(field.value)
    }
    field.addEventListener('input', onInput)
    field.addEventListener('keydown', onKey)
    field.addEventListener('blur', onBlur)
    return () => {
      field.removeEventListener('input', onInput)
      field.removeEventListener('keydown', onKey)
      field.removeEventListener('blur', onBlur)
    }
  }, [input, hits, active, isShown, router])
  useCombobox(input, isShown, hits[active] ? `live-${hits[active].id}` : null)

  if (!isShown) return null
  return (
    <div className="live-results" id={listId}>
      {error ? <p className="live-note" role="status">{error.message}</p> : null}
      {!error && !isFetching && data && hits.length === 0 ? <p className="live-note" role="status">Nothing yet. Press Enter, then “Ask this”.</p> : null}
      <ul role="listbox" aria-label="Results" id={`${listId}-list`}>
        {hits.map((hit, index) => <Option key={hit.id} hit={hit} isActive={index === active} onPick={close} />)}
      </ul>
      {hits.length > 0 ? <Link className="live-all" href={`${results}?${new URLSearchParams({ q: typed })}` as Route} onClick={close}>All results</Link> : null}
    </div>
  )
}

/** What stands in the field. Letters typed while this was being loaded count too, also those between drawing and listening. */
function useTyped(input: Props['input']): string {
  return useSyncExternalStore((changed) => {
    const field = input.current
    field?.addEventListener('input', changed)
    return () => field?.removeEventListener('input', changed)
  }, () => input.current?.value ?? '', () => '')
}

function Option({ hit, isActive, onPick }: { hit: Hit; isActive: boolean; onPick: () => void }) {
  const standing = hit.cautions.filter((c) => !c.waived)
  return (
    <li role="none">
      <Link id={`live-${hit.id}`} role="option" aria-selected={isActive} href={hit.url as Route} tabIndex={-1} onClick={onPick}>
        <span className="label">{hitKindLine(hit)}</span>
        <b>{hit.title}</b>
        {standing.length > 0 ? <span className="live-caution"><CautionWord word={gravestWord(standing.map((c) => c.signalWord))} /> {[...new Set(standing.map((c) => c.title))].join(', ')}</span> : null}
        <span className="live-snippet"><MarkedSnippet text={hit.snippet} marks={hit.marks} /></span>
      </Link>
    </li>
  )
}

/** The combobox attributes live on the field, which was there before this component. */
function useCombobox(input: RefObject<HTMLInputElement | null>, isExpanded: boolean, activeId: string | null): void {
  useEffect(() => {
    const field = input.current
    if (!field) return
    field.setAttribute('role', 'combobox')
    field.setAttribute('aria-autocomplete', 'list')
    field.setAttribute('aria-expanded', String(isExpanded))
    field.setAttribute('aria-controls', `${listId}-list`)
    if (activeId) field.setAttribute('aria-activedescendant', activeId)
    else field.removeAttribute('aria-activedescendant')
  }, [input, isExpanded, activeId])
}
