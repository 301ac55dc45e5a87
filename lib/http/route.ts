// The one wrapper in front of every API handler: who asks, from where, how often, with what; and how refusals look.
import 'server-only'
import { createHash } from 'node:crypto'
import { getMemberByTokenHash } from '@/db/queries/people'
import { currentActor } from '@/lib/auth/current-user'
import { tokenHash } from '@/lib/auth/tokens'
import { contextFor, type AppContext } from '@/lib/context'
import { env } from '@/lib/env'
import { AppError, refuse } from '@/lib/errors'
import { logError } from '@/lib/log'
import type { Actor } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { runtime } from '@/lib/runtime'
import { systemClock } from '@/lib/clock'
import type { z } from 'zod'
import { clientAddress } from './client-address'
import { once } from './once'
import { requireSameOrigin } from './origin'
import { asAppError, invalid, problem } from './problem'
import { countRequest, rateHeaders } from './rate-limit'
import { securityHeaders } from './security-headers'
import { readJson } from './read-body'
import { readUpload, type Upload } from './read-upload'

interface Sent { status: number; body: string | null; headers: Record<string, string> }
export interface Handled { status?: number; body?: unknown; headers?: Record<string, string> }
interface Call<B, Q> {
  context: AppContext
  params: Record<string, string>
  query: Q
  body: B
  /** The whole body of an endpoint that takes a file; empty otherwise. */
  bytes: Uint8Array
  request: Request
}
/** An address without variables has no params at all. */
type RouteContext = { params: Promise<Record<string, string | string[]> | undefined> }

export interface Endpoint<B, Q> {
  /** One line for GET /api/openapi.json. */
  summary: string
  /** What the method takes. */
  query?: z.ZodType<Q>
  body?: z.ZodType<B>
  upload?: Upload
  /** What it gives when it went well, and with which status; 204 gives nothing. */
  response?: z.ZodType
  status?: 200 | 201 | 204
  /** Sends a body only to ask: counted as a read, open to whoever may read, from anywhere. */
  isRead?: true
  /** Open to visitors even with public reading off (health). */
  isAlwaysOpen?: boolean
  handle(call: Call<B, Q>): Promise<Handled>
}
export const methodNames = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const
export type Method = (typeof methodNames)[number]
export type Handler = (request: Request, route: RouteContext) => Promise<Response>

const declarations = new WeakMap<Handler, Endpoint<unknown, unknown>>()
/** What a handler was declared with, for the description of the interface; undefined for a method that is not given. */
export const declarationOf = (handler: Handler) => declarations.get(handler)

/** Declares one method; keeps the schemas' types. */
export const endpoint = <B = undefined, Q = undefined>(e: Endpoint<B, Q>): Endpoint<unknown, unknown> => e as unknown as Endpoint<unknown, unknown>

/** Route handlers of one address; methods that are not given answer 405 as a problem. */
export function routes(methods: Partial<Record<Method, Endpoint<unknown, unknown>>>): Record<Method, Handler> {
  const allow = Object.keys(methods).join(', ')
  const handler = (method: Method): Handler => {
    const declared = methods[method]
    if (!declared) return async () => {
      const response = problem(new AppError('method-not-allowed', `Use ${allow}.`))
      response.headers.set('allow', allow)
      return response
    }
    const made: Handler = (request, route) => answer(request, route, method, declared)
    declarations.set(made, declared)
    return made
  }
  return { GET: handler('GET'), POST: handler('POST'), PUT: handler('PUT'), PATCH: handler('PATCH'), DELETE: handler('DELETE') }
}

async function answer(request: Request, route: RouteContext, method: Method, declared: Endpoint<unknown, unknown>): Promise<Response> {
  let headers: Record<string, string> = { ...securityHeaders, 'cache-control': 'no-store' }
  try {
    const { actor, isBearer } = await whoAsks(request)
    const key = actor ? `member:${actor.id}` : `address:${clientAddress(request.headers)}`
    const isWrite = method !== 'GET' && !declared.isRead
    headers = { ...headers, ...rateHeaders(countRequest(`${isWrite ? 'write' : 'read'}:${key}`, isWrite ? env().WRITES_PER_MINUTE : env().READS_PER_MINUTE, systemClock())) }
    const context = await contextFor(actor)
    if (!declared.isAlwaysOpen && !can(actor, 'read', { publicReading: context.publicReading })) throw refuse.signIn()
    // Before the body is read: a visitor's megabytes are nobody's work.
    if (isWrite && !actor) throw refuse.signIn()
    if (isWrite && !isBearer) requireSameOrigin(request)
    const handled = await perform(request, route, method, declared, context)
    const type: Record<string, string> = handled.body === null ? {} : { 'content-type': 'application/json; charset=utf-8' }
    return new Response(handled.body, { status: handled.status, headers: { ...headers, ...type, ...handled.headers } })
  } catch (error) {
    const expected = asAppError(error)
    if (!expected) logError('api', error, { path: new URL(request.url).pathname })
    const response = expected ? problem(expected) : unexpected()
    for (const [name, value] of Object.entries(headers)) response.headers.set(name, value)
    return response
  }
}

async function perform(request: Request, route: RouteContext, method: Method, declared: Endpoint<unknown, unknown>, context: AppContext): Promise<Sent> {
  const params = Object.fromEntries(Object.entries((await route.params) ?? {}).map(([k, v]) => [k, Array.isArray(v) ? v.join('/') : v]))
  const query = parse(declared.query, readQuery(request))
  const sent = declared.body ? await readJson(request) : null
  const body = declared.body && sent ? parse(declared.body, sent.value) : undefined
  const bytes = declared.upload ? await readUpload(request, declared.upload, context.actor) : new Uint8Array()
  const run = async (): Promise<Sent> => {
    const handled = await declared.handle({ context, params, query, body, bytes, request })
    const status = handled.status ?? declared.status ?? 200
    return { status, body: status === 204 ? null : JSON.stringify(handled.body), headers: handled.headers ?? {} }
  }
  if (method === 'GET' || declared.isRead) return run()
  return onceWhenAsked(request, method, context, sent?.text ?? createHash('sha256').update(bytes).digest('hex'), run)
}

/** With an Idempotency-Key the answer is kept, its headers included, so that a repeat reads the same. */
async function onceWhenAsked(request: Request, method: Method, context: AppContext, bodyText: string, run: () => Promise<Sent>): Promise<Sent> {
  const key = request.headers.get('idempotency-key')
  if (key === null || !context.actor) return run()
  if (!/^[\x21-\x7e]{1,200}$/.test(key)) throw refuse.invalid('Idempotency-Key', 'An Idempotency-Key has 1 to 200 visible characters.')
  const kept = await once(context, { memberId: context.actor.id, route: `${method} ${new URL(request.url).pathname}`, key, bodyText }, async () => {
    const { status, ...sent } = await run()
    return { status, body: JSON.stringify(sent) }
  })
  return { status: kept.status, ...(JSON.parse(kept.body) as Omit<Sent, 'status'>) }
}

/** Session or bearer token. A token that is not (or no longer) good is 401, never silently a visitor. */
async function whoAsks(request: Request): Promise<{ actor: Actor; isBearer: boolean }> {
  const authorization = request.headers.get('authorization')
  if (authorization === null) return { actor: request.headers.has('cookie') ? await currentActor() : null, isBearer: false }
  const token = /^Bearer (pht_[A-Za-z0-9_-]{20,100})$/.exec(authorization)?.[1]
  const { database } = await runtime()
  const found = token ? await getMemberByTokenHash(database.reader, tokenHash(token)) : null
  if (!found) throw new AppError('unauthenticated', 'This token is not known, or was revoked.')
  return { actor: { id: found.member.id, name: found.member.name, role: found.member.role, mark: found.mark }, isBearer: true }
}

/** The query string as an object of strings. 400 when it is not percent-encoded UTF-8 or names a key twice. */
function readQuery(request: Request): Record<string, string> {
  const raw = new URL(request.url).search.slice(1)
  try {
    decodeURIComponent(raw.replaceAll('+', ' '))
  } catch {
    throw new AppError('malformed', 'The query string is not percent-encoded UTF-8.')
  }
  const values: Record<string, string> = {}
  for (const [name, value] of new URLSearchParams(raw)) {
    if (name in values) throw new AppError('malformed', `${name.slice(0, 40)} is given twice.`)
    values[name] = value
  }
  return values
}

function parse(schema: z.ZodType<unknown> | undefined, value: unknown): unknown {
  if (!schema) {
    const extra = Object.keys(value as Record<string, unknown>)[0]
    if (extra !== undefined) throw refuse.invalid(extra.slice(0, 40), `Unknown field ${extra.slice(0, 40)}.`)
    return undefined
  }
  const result = schema.safeParse(value)
  if (!result.success) throw invalid(result.error)
  return result.data
}

function unexpected(): Response {
  return Response.json({ type: 'about:blank#unexpected', title: 'Something broke here', status: 500, detail: 'It is logged. Nothing you sent was lost on your side; try again.' },
    { status: 500, headers: { 'content-type': 'application/problem+json' } })
}
