// Where people reach this installation, for addresses that leave the page: codes on paper, links to pass on.
import 'server-only'
import { env } from '@/lib/env'

/** PUBLIC_URL where it is set; else the origin this request came to, since a phone in the garage opens the code by that name. */
export function ownOrigin(headers: Headers): string {
  const host = headers.get('host')
  if (env().PUBLIC_URL !== undefined || host === null) return env().publicUrl
  const protocol = env().TRUST_PROXY && headers.get('x-forwarded-proto') === 'https' ? 'https' : 'http'
  const address = `${protocol}://${host}`
  return URL.canParse(address) ? new URL(address).origin : env().publicUrl
}
