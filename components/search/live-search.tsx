'use client'
// Suggestions and results while typing, under the search line: an ARIA combobox whose options are links (use-combobox.ts), and on
// phones the trade keys. Loaded at the first focus.
import { QueryClient, QueryClientProvider, keepPreviousData, useQuery } from '@tanstack/react-query'
import type { Route } from 'next'
import Link from 'next/link'
import { useRouter } from 'next/navigation'
import { useMemo, useState, useSyncExternalStore, type RefObject } from 'react'
import { completionsOf, liveResults } from '@/lib/client/queries'
import { useRested } from '@/lib/client/use-rested'
import { LiveOptions, type LiveOption } from './live-options'
import { TradeKeys } from './trade-keys'
import { useCombobox } from './use-combobox'

interface Props { input: RefObject<HTMLInputElement | null>; shown: string; results: Route }
const client = new QueryClient({ defaultOptions: { queries: { retry: 1, refetchOnWindowFocus: false } } })
const [popupId, listId] = ['live-results', 'live-results-list']
const mostSuggestions = 4

export default function LiveSearch(props: Props) {
  return (
    <QueryClientProvider client={client}>
      <Results {...props} />
      <TradeKeys input={props.input} />
    </QueryClientProvider>
  )
}

function Results({ input, shown, results }: Props) {
  const router = useRouter()
  const typed = useTyped(input)
  // Closed for one text; typing on opens it again. The words a results page was found by are closed to begin with.
  const [closedFor, setClosedFor] = useState<string | null>(shown === '' ? null : shown)
  const { options, error, isSettled } = useOptions(typed)
  const isOpen = closedFor !== typed && typed.trim() !== ''
  const close = () => setClosedFor(input.current?.value ?? typed)
  const activeId = useCombobox({
    input, listId, popupId, options, isOpen, close, open: () => setClosedFor(null),
    choose: (index) => { const chosen = options[index]; if (chosen) router.push(chosen.url as Route) },
  })
  const nothing = isOpen && isSettled && options.length === 0
  return (
    <>
      <p className="sr-only" role="status">{isOpen && isSettled ? counted(options) : ''}</p>
      {isOpen && (options.length > 0 || error || nothing) ? (
        <div className="live-results" id={popupId}>
          {error ? <p className="live-note" role="alert">{error.message}</p> : null}
          {nothing && !error ? <p className="live-note">Nothing yet. Press Enter, then “Ask this”.</p> : null}
          {options.length > 0 ? <LiveOptions listId={listId} options={options} activeId={activeId} onPick={close} /> : null}
          {options.length > 0 ? <Link className="live-all" href={`${results}?${new URLSearchParams({ q: typed })}` as Route} onClick={close}>All results</Link> : null}
        </div>
      ) : null}
    </>
  )
}

/** What a screen reader hears once typing has rested. */
function counted(options: readonly LiveOption[]): string {
  if (options.length === 0) return 'Nothing yet. Press Enter, then Ask this.'
  const hits = options.filter((option) => 'hit' in option).length
  const say = (count: number, one: string) => (count === 0 ? [] : [`${count} ${one}${count === 1 ? '' : 's'}`])
  return `${[...say(options.length - hits, 'suggestion'), ...say(hits, 'result')].join(' and ')}. Down arrow to choose.`
}

/** Suggestions without the entries, which stand among the results with all that belongs to them. */
function useOptions(typed: string): { options: readonly LiveOption[]; error: Error | null; isSettled: boolean } {
  const words = useRested(typed, 150)
  const completions = useQuery({ ...completionsOf(words), placeholderData: keepPreviousData })
  const found = useQuery({ ...liveResults(words), placeholderData: keepPreviousData })
  const options = useMemo((): LiveOption[] => {
    if (words.trim() === '') return []
    const suggestions = (completions.data?.items ?? []).filter(({ kind }) => kind !== 'question' && kind !== 'lesson').slice(0, mostSuggestions)
    return [
      ...suggestions.map((suggestion, index) => ({ id: `live-suggestion-${index}`, url: suggestion.url, suggestion })),
      ...(found.data?.results ?? []).map((hit) => ({ id: `live-${hit.id}`, url: hit.url, hit })),
    ]
  }, [words, completions.data, found.data])
  return { options, error: found.error, isSettled: words === typed && !found.isFetching && !completions.isFetching && found.data !== undefined }
}

/** What stands in the field. Letters typed while this was being loaded count too, also those between drawing and listening. */
function useTyped(input: Props['input']): string {
  return useSyncExternalStore((changed) => {
    const field = input.current
    field?.addEventListener('input', changed)
    return () => field?.removeEventListener('input', changed)
  }, () => input.current?.value ?? '', () => '')
}
