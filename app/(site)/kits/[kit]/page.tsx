// One kit: its place on the kits page.
import { notFound, redirect } from 'next/navigation'
import { pageContext } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { listPlaces } from '@/lib/services/kits/list-places'

export default async function KitPage({ params }: PageProps<'/kits/[kit]'>) {
  const { kit } = await params
  const { kits } = await listPlaces(await pageContext())
  if (!kits.some((k) => k.slug === kit)) notFound()
  redirect(`${paths.kits}#${kit}` as typeof paths.kits)
}
