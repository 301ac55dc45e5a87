// Cross-site posts: a write that rides on the session cookie must come from our own pages.
import 'server-only'
import { env } from '@/lib/env'
import { AppError } from '@/lib/errors'

/** Throws 403 unless Sec-Fetch-Site or Origin says that the request is from here. Bearer requests don't need it. */
export function requireSameOrigin(request: Request): void {
  const origin = request.headers.get('origin')
  const host = request.headers.get('host')
  const own = origin !== null && (sameHost(origin, host) || origin === new URL(env().publicUrl).origin)
  const site = request.headers.get('sec-fetch-site')
  if (own && (site === null || site === 'same-origin')) return
  if (origin === null && site === 'same-origin') return
  throw new AppError('forbidden', 'This came from another site. Use our own pages, or a token.')
}

function sameHost(origin: string, host: string | null): boolean {
  try {
    return host !== null && new URL(origin).host === host
  } catch {
    return false
  }
}
