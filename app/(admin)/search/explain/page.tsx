// Why results stand in their order, for stewards: the question as understood, and each hit's score as the product it is.
import type { Metadata } from 'next'
import { readSearchAddress } from '@/app/search-address'
import { HitPlate } from '@/components/entries/hit-list'
import { Sheet } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { ExplainedHitSheet } from '@/components/search/explained-hit-sheet'
import { ExplainedQuery } from '@/components/search/explained-query'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { TextField } from '@/components/ui/text-field'
import { requireCan } from '@/lib/auth/guards'
import type { AppContext } from '@/lib/context'
import { paths, type SearchAddress } from '@/lib/paths'
import { searchQuerySchema } from '@/lib/schemas/search'
import { SearchLoadingError } from '@/lib/search/messages'
import { explainSearch } from '@/lib/services/search/explain-search'

export const metadata: Metadata = { title: 'Why this order' }

const pageSize = 10

export default async function ExplainPage({ searchParams }: PageProps<'/search/explain'>) {
  const context = await requireCan('search.explain')
  const address = readSearchAddress(await searchParams)
  return (
    <>
      <PageTitle title="Why this order" lead="Score = text × evidence × directness; with three words or more, what the first hits share counts too. What fits the question best comes first; evidence decides between texts that fit about equally well." />
      <form action={paths.explainSearch()} method="get" className="explained-form">
        {Object.entries(address).map(([name, value]) => name !== 'q' && name !== 'offset' && value !== undefined ? <input key={name} type="hidden" name={name} value={value} /> : null)}
        <TextField id="explain-q" name="q" label="A search to explain" type="search" defaultValue={address.q ?? ''} maxLength={500} />
        <Button type="submit" look="primary">Explain</Button>
      </form>
      {address.q?.trim() ? await explained(context, address) : null}
    </>
  )
}

async function explained(context: AppContext, address: SearchAddress) {
  const parsed = searchQuerySchema.safeParse({ ...address, offset: String(address.offset ?? 0), limit: String(pageSize) })
  if (!parsed.success) return <NoticeLine boxed live>{parsed.error.issues[0]?.message ?? 'These filters do not fit together.'}</NoticeLine>
  const explanation = await explainSearch(context, parsed.data).catch((error: unknown) => {
    if (error instanceof SearchLoadingError) return null
    throw error
  })
  if (!explanation) return <NoticeLine boxed live>Search is loading: the index is being built. Reload in a few seconds.</NoticeLine>
  const { hits, total } = explanation
  const offset = parsed.data.offset
  return (
    <>
      <HitPlate hits={hits.map(({ hit }) => hit)} />
      <ExplainedQuery explanation={explanation} />
      {hits.length === 0 ? null : (
        <section className="page-body" aria-labelledby="explained-hits">
          <RivetLine title="Hits" id="explained-hits" note={`${offset + 1} to ${offset + hits.length} of ${total}`} />
          <Sheet>{hits.map((hit, index) => <ExplainedHitSheet key={hit.hit.id} place={offset + index + 1} explained={hit} />)}</Sheet>
        </section>
      )}
      <nav className="button-row" aria-label="Results">
        <LinkButton href={paths.search(address)}>Results</LinkButton>
        {offset + hits.length < total ? <LinkButton href={paths.explainSearch({ ...address, offset: offset + pageSize })}>More</LinkButton> : null}
      </nav>
    </>
  )
}
