// Crawlers: reading pages only.
import type { MetadataRoute } from 'next'

export default function robots(): MetadataRoute.Robots {
  return { rules: { userAgent: '*', allow: '/', disallow: ['/api/', '/account', '/desk', '/people', '/ask', '/lesson', '/search', '/builds', '/holds', '/visits'] } }
}
