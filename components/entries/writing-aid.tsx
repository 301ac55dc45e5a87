'use client'
// Beside a text being written: posts that may already answer it, cautions that will stand on it, how it will look.
// Loaded when the writing begins (TanStack Query comes with it). The acknowledgements are fields of the form around it.
import { QueryClient, QueryClientProvider, keepPreviousData, useQuery } from '@tanstack/react-query'
import Link from 'next/link'
import type { Route } from 'next'
import { useState } from 'react'
import { CautionWord, gravestWord } from '@/components/cautions/caution-word'
import { Prose } from '@/components/prose/prose'
import { Button } from '@/components/ui/button'
import { checksOf, previewOf, requiredOf, similarTo, type WritingText } from '@/lib/client/queries'
import { useRested } from '@/lib/client/use-rested'
import type { Caution } from '@/lib/schemas/post'
import { NumbersCheckList } from './numbers-check-list'
import { Acknowledge } from './acknowledge'

interface Props { text: WritingText; shown: string; wantsSimilar: boolean; acknowledged: readonly string[]; standing: readonly Caution[] }
const client = new QueryClient({ defaultOptions: { queries: { retry: 1, refetchOnWindowFocus: false } } })

export default function WritingAid(props: Props) {
  return <QueryClientProvider client={client}><Aid {...props} /></QueryClientProvider>
}

function Aid({ text, shown, wantsSimilar, acknowledged, standing }: Props) {
  const rested = useRested(JSON.stringify(text), 600)
  const settled = JSON.parse(rested) as WritingText
  const { data } = useQuery({ ...requiredOf(settled), placeholderData: keepPreviousData, enabled: settled.body.trim() !== '' || settled.title.trim() !== '' })
  // What the server asked for after a refusal counts beside what it says now: nothing that was required goes away on the screen.
  const required = [...standing, ...(data?.cautions ?? []).filter((c) => !standing.some((s) => s.code === c.code))]
  return (
    <>
      {wantsSimilar ? <Similar text={settled} /> : null}
      <Preview body={shown} />
      <Numbers body={shown} hardware={settled.hardware} kit={settled.kit} />
      <Acknowledge cautions={required} acknowledged={acknowledged} />
    </>
  )
}

function Similar({ text }: { text: WritingText }) {
  const { data } = useQuery({ ...similarTo(text), placeholderData: keepPreviousData })
  const hits = data?.results ?? []
  return (
    <section className="aid" aria-live="polite">
      <h2>May already answer it</h2>
      {hits.length === 0 ? <p className="text-small">Nothing like it yet.</p> : (
        <ul>
          {hits.slice(0, 4).map((hit) => {
            const cautions = hit.cautions.filter((c) => !c.waived)
            return (
              <li key={hit.id}>
                <Link href={hit.url as Route} target="_blank">{hit.title}</Link>{hit.stamp === 'stamped' ? ' · stamped' : ''}
                {cautions.length > 0 ? <span className="live-caution"><CautionWord word={gravestWord(cautions.map((c) => c.signalWord))} /> {cautions[0]?.title}</span> : null}
              </li>
            )
          })}
        </ul>
      )}
    </section>
  )
}

/** Never in the way of posting: a table can be wrong for this part, and the author knows which part it is. */
function Numbers({ body, hardware, kit }: { body: string; hardware: readonly string[]; kit: string | undefined }) {
  const rested = useRested(body, 600)
  const { data } = useQuery({ ...checksOf(rested, hardware, kit), placeholderData: keepPreviousData })
  if (!data || data.checks.length === 0) return null
  return <section className="aid" aria-live="polite"><h2>Numbers check</h2><NumbersCheckList posts={[{ label: '', checks: data.checks }]} kit={kit} /></section>
}

function Preview({ body }: { body: string }) {
  const [isOpen, setOpen] = useState(false)
  const rested = useRested(body, 500)
  const { data, error, isFetching } = useQuery({ ...previewOf(rested), enabled: isOpen && rested.trim() !== '' })
  return (
    <section className="aid">
      <Button aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>{isOpen ? 'Close the preview' : 'Preview'}</Button>
      {isOpen ? <div className="aid-preview" aria-live="polite">{error ? <p>{error.message}</p> : data?.html ? <Prose html={data.html} small /> : <p className="text-small">{isFetching ? 'Drawing it' : 'Nothing written yet.'}</p>}</div> : null}
    </section>
  )
}
