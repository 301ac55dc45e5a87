// Calls the real route handlers with a real Request, and checks every answer against the schema that describes it.
import { expect } from 'vitest'
import { allRoutes } from '@/app/api/all-routes'
import * as description from '@/app/api/openapi.json/route'
import * as elsewhere from '@/app/api/[[...path]]/route'
import { declarationOf, type Handler, type Method } from '@/lib/http/route'
import { problemSchema } from '@/lib/schemas/problem'

interface Sending { token?: string; body?: unknown; raw?: string | Uint8Array<ArrayBuffer>; headers?: Record<string, string> }
export interface Answered<T = Record<string, never>> { status: number; headers: Headers; body: T; text: string }

const addresses = Object.entries({ ...allRoutes, '/api/openapi.json': description }).map(([template, handlers]) => ({
  handlers, pattern: new RegExp(`^${template.replaceAll('.', '\\.').replace(/\{(\w+)\}/g, '(?<$1>[^/]+)')}$`),
}))

function find(pathname: string): { handlers: Record<Method, Handler>; params: Record<string, string | string[]> } {
  for (const { handlers, pattern } of addresses) {
    const match = pattern.exec(pathname)
    if (match) return { handlers, params: Object.fromEntries(Object.entries(match.groups ?? {}).map(([k, v]) => [k, decodeURIComponent(v)])) }
  }
  return { handlers: elsewhere, params: { path: pathname.split('/').slice(2) } }
}

/** A call as a client makes it. `body` is sent as JSON, `raw` as it is. */
export async function api<T = any>(method: Method, path: string, { token, body, raw, headers = {} }: Sending = {}): Promise<Answered<T>> { // eslint-disable-line @typescript-eslint/no-explicit-any -- the caller knows the shape; it is checked below
  const url = new URL(path, 'http://localhost:3000')
  const { handlers, params } = find(url.pathname)
  const sent = raw ?? (body === undefined ? null : JSON.stringify(body))
  const request = new Request(url, {
    method, body: sent,
    headers: { host: 'localhost:3000', ...(body !== undefined ? { 'content-type': 'application/json' } : {}), ...(token ? { authorization: `Bearer ${token}` } : {}), ...headers },
  })
  const response = await handlers[method](request, { params: Promise.resolve(params) })
  const text = await response.text()
  const value = text === '' ? undefined : (JSON.parse(text) as T)
  checkAgainstSchema(response, value, handlers[method], `${method} ${path} ${response.status}`)
  return { status: response.status, headers: response.headers, body: value as T, text }
}

function checkAgainstSchema(response: Response, value: unknown, handler: Handler, what: string): void {
  const isProblem = response.status >= 400 && response.headers.get('content-type') === 'application/problem+json'
  const schema = isProblem ? problemSchema : declarationOf(handler)?.response
  if (response.status >= 400 && !isProblem) expect(response.status, what).toBe(503)
  if (!schema) return expect(value, what).toBeUndefined()
  // Parsing drops what the schema does not know, so equality also finds fields that are not described.
  expect(schema.parse(value), what).toEqual(value)
}
