// Headers only: the nonce-based content security policy of every page, and the headers that go with it.
// Rights are never checked here. API bodies must not pass through (the framework buffers them), so /api is not matched.
import { NextResponse, type NextRequest } from 'next/server'
import { contentSecurityPolicy, securityHeaders } from '@/lib/http/security-headers'

export function proxy(request: NextRequest): NextResponse {
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

export const config = { matcher: [{ source: '/((?!api/|_next/static|_next/image|fonts/|icon.svg|favicon.ico).*)', missing: [{ type: 'header', key: 'next-router-prefetch' }] }] }
