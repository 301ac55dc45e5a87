// Runs a handler inside the framework's own request scope, with a session cookie that was really signed, so that the cookie
// door can be tried without a server. Reaches into the pinned framework; the browser tests are the last word.
import { env } from '@/lib/env'
import type { Somebody } from './factories'

/** The Cookie header of somebody who is signed in. */
export async function sessionCookie(person: Pick<Somebody, 'id'>, sessionEpoch = 0): Promise<string> {
  const { sessionCookieName, sessionToken } = await import('@/lib/auth/session-cookie')
  return `${sessionCookieName()}=${await sessionToken({ id: person.id, sessionEpoch }, env().secret)}`
}

/** Runs `work` as one request that carries `cookie`. */
export async function inRequest<T>(cookie: string, work: () => Promise<T>): Promise<T> {
  const { workAsyncStorage } = await import('next/dist/server/app-render/work-async-storage.external')
  const { workUnitAsyncStorage } = await import('next/dist/server/app-render/work-unit-async-storage.external')
  const { HeadersAdapter } = await import('next/dist/server/web/spec-extension/adapters/headers')
  const { RequestCookies } = await import('next/dist/compiled/@edge-runtime/cookies')
  const headers = new Headers({ cookie })
  const store = { type: 'request', phase: 'action', headers: HeadersAdapter.seal(headers), cookies: new RequestCookies(headers), userspaceMutableCookies: new RequestCookies(headers) }
  return workAsyncStorage.run({ route: '/api' } as never, () => workUnitAsyncStorage.run(store as never, work))
}
