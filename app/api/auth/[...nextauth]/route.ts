// next-auth's own addresses: its session, token and credentials calls. Its ready-made pages are not ours and lead to our sign-in.
import NextAuth from 'next-auth'
import type { NextRequest } from 'next/server'
import { authOptions } from '@/lib/auth/options'
import { paths } from '@/lib/paths'

type Context = { params: Promise<{ nextauth: string[] }> }

/** Pages of the library that would be HTML without our look and against our content security policy. */
const readyMadePages: ReadonlySet<string> = new Set(['signout', 'verify-request', 'error'])

async function answer(request: NextRequest, context: Context): Promise<Response> {
  const [action = ''] = (await context.params).nextauth
  if (request.method === 'GET' && readyMadePages.has(action)) return new Response(null, { status: 303, headers: { location: paths.signIn() } })
  return NextAuth(request, context, authOptions()) as Promise<Response>
}

export { answer as GET, answer as POST }
