// Keys and fetchers of what the browser reads from the API. Every fetch can be cancelled.
import { queryOptions } from '@tanstack/react-query'
import type { Caution } from '@/lib/schemas/post'
import type { NumbersCheckItem } from '@/lib/schemas/numbers-check'
import type { Hit, SearchResult, Suggestion } from '@/lib/schemas/search'

async function readJson<T>(url: string, signal: AbortSignal, body?: unknown): Promise<T> {
  const response = await fetch(url, {
    signal, ...(body === undefined ? {} : { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify(body) }),
  })
  if (!response.ok) {
    const problem = (await response.json().catch(() => null)) as { detail?: string } | null
    throw new Error(problem?.detail ?? 'The server did not answer. Try again.')
  }
  return (await response.json()) as T
}

export interface WritingText { title: string; body: string; kit?: string | undefined; tasks: string[]; sections: string[]; hardware: string[]; /** What the text is an answer to, whose cautions it takes. */ answerTo?: { question: number; body: string } }

/** Results while typing: the first six. */
export const liveResults = (words: string) => queryOptions({
  queryKey: ['search', words], enabled: words.trim() !== '', staleTime: 10_000,
  queryFn: ({ signal }) => readJson<SearchResult>(`/api/search?${new URLSearchParams({ q: words, limit: '6' })}`, signal),
})

/** What completes the words: shop tables, sections, operations, entries. */
export const completionsOf = (words: string) => queryOptions({
  queryKey: ['suggest', words], enabled: words.trim() !== '', staleTime: 10_000,
  queryFn: ({ signal }) => readJson<{ items: Suggestion[] }>(`/api/suggest?${new URLSearchParams({ q: words })}`, signal),
})

/** Posts that may already answer a question being written. */
export const similarTo = (text: WritingText) => queryOptions({
  queryKey: ['similar', text.title, text.body, text.kit], enabled: text.title.trim().length >= 8, staleTime: 30_000,
  queryFn: ({ signal }) => readJson<{ results: Hit[] }>('/api/similar', signal, { title: text.title.slice(0, 160), body: text.body.slice(0, 20_000), ...(text.kit ? { kit: text.kit } : {}) }),
})

/** Cautions the rules require of a text being written. */
export const requiredOf = (text: WritingText) => queryOptions({
  queryKey: ['required', text], staleTime: 30_000,
  queryFn: ({ signal }) => readJson<{ cautions: Caution[] }>('/api/cautions/required', signal,
    text.answerTo ?? { title: text.title.slice(0, 160), body: text.body, tasks: text.tasks, sections: text.sections, hardware: text.hardware, ...(text.kit ? { kit: text.kit } : {}) }),
})

/** The numbers of a text against the shop tables and the limits of the kit it is about. */
export const checksOf = (body: string, hardware: readonly string[], kit: string | undefined) => queryOptions({
  queryKey: ['numbers-check', body, hardware, kit], enabled: body.trim() !== '', staleTime: 30_000,
  queryFn: ({ signal }) => readJson<{ checks: NumbersCheckItem[] }>('/api/numbers-check', signal, { text: body, hardware, ...(kit ? { kit } : {}) }),
})

/** Markdown as it will look. */
export const previewOf = (body: string) => queryOptions({
  queryKey: ['preview', body], staleTime: Infinity,
  queryFn: ({ signal }) => readJson<{ html: string }>('/api/preview', signal, { body }),
})
