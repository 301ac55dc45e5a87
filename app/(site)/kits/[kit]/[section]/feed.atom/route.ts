// The newest entries of one section.
import { env } from '@/lib/env'
import { feedResponse } from '@/lib/http/feed'
import { pathSegment } from '@/lib/http/path-segment'
import { paths } from '@/lib/paths'
import { atomFeed } from '@/lib/services/feeds/atom-feed'
import { getSectionPage } from '@/lib/services/kits/get-section-page'

export async function GET(_request: Request, { params }: RouteContext<'/kits/[kit]/[section]/feed.atom'>): Promise<Response> {
  const { kit, section } = await params
  const code = pathSegment(section)
  return feedResponse(async (context) => {
    const page = code === null ? null : await getSectionPage(context, kit, code)
    if (!page || code === null) return null
    const base = env().publicUrl
    return atomFeed(context, { kit, section: code }, { title: `Pilothole: ${page.kit.name} ${page.code} ${page.title}`, page: `${base}${paths.section(kit, code)}`, self: `${base}${paths.sectionFeed(kit, code)}`, baseUrl: base })
  })
}
