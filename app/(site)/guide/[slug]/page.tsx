// Pages of the house itself, from content/pages.
import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import type { ComponentProps } from 'react'
import { Sheet } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { loadPage } from '@/lib/content/load-page'

export async function generateMetadata({ params }: PageProps<'/guide/[slug]'>): Promise<Metadata> {
  const page = await loadPage((await params).slug, {})
  return page ? { title: page.title, description: page.summary } : {}
}

export default async function GuidePage({ params }: PageProps<'/guide/[slug]'>) {
  const page = await loadPage((await params).slug, { table: ScrollingTable })
  if (!page) notFound()
  const { Content } = page
  return (
    <>
      <PageTitle title={page.title} lead={page.summary} />
      <Sheet as="article"><div className="sheet-body prose"><Content /></div></Sheet>
    </>
  )
}

/** As the tables of posts: wider than its column it scrolls, with the keyboard too. */
function ScrollingTable(props: ComponentProps<'table'>) {
  return <div className="table-scroll" role="group" aria-label="Table" tabIndex={0}><table {...props} /></div>
}
