// Pages of the house itself, from content/pages.
import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { Sheet } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { loadPage } from '@/lib/content/load-page'

export async function generateMetadata({ params }: PageProps<'/guide/[slug]'>): Promise<Metadata> {
  const page = await loadPage((await params).slug, {})
  return page ? { title: page.title, description: page.summary } : {}
}

export default async function GuidePage({ params }: PageProps<'/guide/[slug]'>) {
  const page = await loadPage((await params).slug, {})
  if (!page) notFound()
  const { Content } = page
  return (
    <>
      <PageTitle title={page.title} lead={page.summary} />
      <Sheet as="article"><div className="sheet-body prose"><Content /></div></Sheet>
    </>
  )
}
