// The results page: works without JavaScript. Filters stand in the address; hits are grouped stamped, not stamped, open.
import type { Metadata, Route } from 'next'
import Link from 'next/link'
import { readSearchAddress } from '@/app/search-address'
import { HitList, HitPlate, hitAnchor } from '@/components/entries/hit-list'
import { RivetLine } from '@/components/layout/rivet-line'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { ComputedAnswer } from '@/components/shop/computed-answer'
import { SearchFilters } from '@/components/search/search-filters'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { pageContext } from '@/lib/auth/guards'
import { findContrary } from '@/lib/format/order-words'
import { readerUnits } from '@/lib/auth/reader-units'
import { firstSystem } from '@/lib/format/units-choice'
import { paths, type SearchAddress } from '@/lib/paths'
import { SearchLoadingError } from '@/lib/search/messages'
import { searchQuerySchema, type Hit, type SearchResult } from '@/lib/schemas/search'
import { listPlaces } from '@/lib/services/kits/list-places'
import { can } from '@/lib/policy/can'
import { searchEntries } from '@/lib/services/search/search-entries'

export async function generateMetadata({ searchParams }: PageProps<'/search'>): Promise<Metadata> {
  const { q } = await searchParams
  return { title: typeof q === 'string' && q.trim() ? `“${q.slice(0, 60)}”` : 'Search' }
}

const pageSize = 20

export default async function SearchPage({ searchParams }: PageProps<'/search'>) {
  const context = await pageContext()
  const given = await searchParams
  const address = readSearchAddress(given)
  const parsed = searchQuerySchema.safeParse({ ...address, ...(address.offset !== undefined ? { offset: String(address.offset) } : {}), limit: String(pageSize) })
  const places = await listPlaces(context)
  const filters = <SearchFilters address={address} places={places} />
  if (!parsed.success) return <>{filters}<NoticeLine boxed live>{parsed.error.issues[0]?.message ?? 'These filters do not fit together.'} <Link href={paths.search({ q: address.q?.slice(0, 500) })}>Search without filters</Link></NoticeLine></>
  const result = await searchEntries(context, parsed.data).catch((error: unknown) => {
    if (error instanceof SearchLoadingError) return null
    throw error
  })
  if (!result) return <>{filters}<NoticeLine boxed live>Search is loading: the index is being built. Everything else works; reload in a few seconds.</NoticeLine></>
  const first = firstSystem(await readerUnits())
  return (
    <>
      {filters}
      <Results result={result} address={address} first={first} />
      {address.q?.trim() && can(context.actor, 'search.explain') ? <p className="text-small"><Link href={paths.explainSearch(address)}>Why these results stand in this order</Link></p> : null}
    </>
  )
}

function Results({ result, address, first }: { result: SearchResult; address: SearchAddress; first: 'inch' | 'metric' }) {
  const { results, query, total } = result
  const groups = [
    { title: 'Stamped', hits: results.filter((h) => h.stamp === 'stamped') },
    { title: 'Not stamped', hits: results.filter((h) => h.stamp !== 'stamped' && !h.open) },
    { title: 'Open questions', hits: results.filter((h) => h.open) },
  ].filter((g) => g.hits.length > 0)
  const words = address.q?.trim() ?? ''
  const contrary = findContrary(results.flatMap((hit) => hit.orderAdvice ?? []))
  const ask = paths.ask({ title: words.slice(0, 160), ...(address.kit ? { kit: address.kit } : {}), ...(address.section ? { section: address.section } : {}) })
  const offset = address.offset ?? 0
  const balloons = result.computed.flatMap((answer) => answer.balloons)
  const posts = groups.flatMap((group) => group.hits).map((hit) => ({ balloons: hit.balloons, title: hit.title, anchor: hitAnchor(hit) }))
  return (
    <>
      <h1 className="sr-only">{words ? `Results for ${words}` : 'All entries'}</h1>
      {query.didYouMean ? <NoticeLine icon="search">Did you mean <Link href={paths.search({ ...address, q: query.didYouMean, offset: undefined })}>{query.didYouMean}</Link>?</NoticeLine> : null}
      {contrary ? <NoticeLine boxed>Builders disagree here: some advise {contrary.one} before {contrary.other}, some the other way round. Both are below, each with what speaks for it. The plans decide.</NoticeLine> : null}
      {query.ignored.length > 0 ? <NoticeLine>Too many words: left out {query.ignored.join(', ')}.</NoticeLine> : null}
      {result.computed.map((answer) => <ComputedAnswer key={answer.url} answer={answer} first={first} posts={posts} />)}
      {result.computed.length > 0 && results.length === 0 ? <CautionPlate cautions={result.computed.flatMap((a) => a.cautions)} /> : null}
      {results.length === 0 ? <NothingFound words={words} ask={ask} address={address} /> : (
        <>
          <HitPlate hits={results} also={result.computed.flatMap((a) => a.cautions)} />
          {groups.map((group) => (
            <section key={group.title} aria-labelledby={`group-${group.title}`} className="page-body">
              <RivetLine title={group.title} id={`group-${group.title}`} />
              <HitList hits={group.hits} balloons={balloons} actionFor={sayWhatToDo} />
            </section>
          ))}
          <Pager address={address} offset={offset} total={total} />
          <p className="text-small">Not it? <Link href={ask}>Ask this</Link>: your words are filled in.</p>
        </>
      )}
    </>
  )
}

const sayWhatToDo = (hit: Hit) => hit.open ? <LinkButton href={`${paths.entry(hit.id)}#say` as Route}>Say what to do</LinkButton> : null

function NothingFound({ words, ask, address }: { words: string; ask: Route; address: SearchAddress }) {
  const hasFilters = Boolean(address.kit || address.section || address.operation || address.kind || address.stamped)
  return (
    <EmptyState title={words ? `Nothing here about “${words.slice(0, 120)}”` : 'Nothing fits these filters'}
      action={<><LinkButton href={ask} look="primary">Ask this</LinkButton>{hasFilters ? <LinkButton href={paths.search({ q: address.q })}>Search everywhere</LinkButton> : null}</>}>
      <p>Nobody has written about it yet{hasFilters ? ', or not where you are looking' : ''}. Ask, and your words come along. Until then: the plans, then the kit maker.</p>
    </EmptyState>
  )
}

function Pager({ address, offset, total }: { address: SearchAddress; offset: number; total: number }) {
  if (total <= pageSize && offset === 0) return null
  return (
    <nav aria-label="More results" className="button-row">
      {offset > 0 ? <LinkButton href={paths.search({ ...address, offset: Math.max(0, offset - pageSize) || undefined })}>Before</LinkButton> : null}
      {offset + pageSize < total ? <LinkButton href={paths.search({ ...address, offset: offset + pageSize })}>More</LinkButton> : null}
      <span className="text-small">{offset + 1} to {Math.min(offset + pageSize, total)} of {total}</span>
    </nav>
  )
}
