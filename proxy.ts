// The nonce-based content security policy of every page and the headers that go with it; and a form sent from another site ends here,
// since the framework would answer it with an error of its own. Rights are never checked here. API bodies must not pass through (the framework buffers them), so /api is not matched.
import { NextResponse, type NextRequest } from 'next/server'
import { contentSecurityPolicy, securityHeaders } from '@/lib/http/security-headers'

export function proxy(request: NextRequest): NextResponse {
  if (isFromElsewhere(request)) return new NextResponse('This came from another site. Use our own pages.', { status: 403, headers: { ...securityHeaders, 'content-type': 'text/plain; charset=utf-8' } })
  if (!isDecodable(request.nextUrl.pathname)) return new NextResponse('This address is not percent-encoded UTF-8.', { status: 400, headers: { ...securityHeaders, 'content-type': 'text/plain; charset=utf-8' } })
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64')
  const policy = contentSecurityPolicy(nonce)
  const headers = new Headers(request.headers)
  headers.set('x-nonce', nonce)
  headers.set('content-security-policy', policy)
  const response = NextResponse.next({ request: { headers } })
  response.headers.set('content-security-policy', policy)
  for (const [name, value] of Object.entries(securityHeaders)) response.headers.set(name, value)
  return response
}

function isDecodable(pathname: string): boolean {
  try {
    decodeURIComponent(pathname)
    return true
  } catch {
    return false
  }
}

/** A write that our own pages did not send. Browsers leave Sec-Fetch-Site out on plain http, so Origin decides there. */
function isFromElsewhere({ method, headers }: NextRequest): boolean {
  if (method === 'GET' || method === 'HEAD') return false
  const site = headers.get('sec-fetch-site')
  if (site !== null && site !== 'same-origin') return true
  const origin = headers.get('origin')
  if (origin === null) return site === null
  return !URL.canParse(origin) || new URL(origin).host !== (headers.get('x-forwarded-host') ?? headers.get('host'))
}

export const config = { matcher: [{ source: '/((?!api/|_next/static|_next/image|fonts/|icon.svg|favicon.ico).*)', missing: [{ type: 'header', key: 'next-router-prefetch' }] }] }
