// The newest entries of the whole house.
import { env } from '@/lib/env'
import { feedResponse } from '@/lib/http/feed'
import { paths } from '@/lib/paths'
import { atomFeed } from '@/lib/services/feeds/atom-feed'

export const GET = () => feedResponse((context) => atomFeed(context, {}, { title: 'Pilothole', page: `${env().publicUrl}/`, self: `${env().publicUrl}${paths.feed}`, baseUrl: env().publicUrl }))
