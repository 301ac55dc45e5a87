// The one wrapper in front of every form action: signed-in member, origin, haste, parsing, repeats; and how refusals come back.
import 'server-only'
import { refresh } from 'next/cache'
import { headers } from 'next/headers'
import { redirect } from 'next/navigation'
import type { Route } from 'next'
import type { z } from 'zod'
import { currentActor } from '@/lib/auth/current-user'
import { systemClock } from '@/lib/clock'
import { contextFor, type AppContext } from '@/lib/context'
import { env } from '@/lib/env'
import { AppError } from '@/lib/errors'
import type { FormState } from '@/lib/form-state'
import type { Caution } from '@/lib/schemas/post'
import { clientAddress } from './client-address'
import { once } from './once'
import { asAppError, invalid } from './problem'
import { countRequest } from './rate-limit'

interface Work<T> {
  form: FormData
  schema: z.ZodType<T>
  /** Picks named fields; FormData also carries the framework's own, which a strict schema would refuse.
   *  Forms about a post wrap their schema as { postId, input }: errors come back by the fields' own names. */
  read(form: FormData): unknown
  /** Does it, and says where to go next, or returns null to stay with `done`. */
  run(context: AppContext, input: T): Promise<Route | null>
  done?: string
  /** A name for repeats: a form that carries a `submission` field is carried out once. */
  once?: string
}

/** Carries out a form. Redirects on success; otherwise the state the form shows, with everything that was typed. */
export async function carryOut<T>({ form, schema, read, run, done, once: route }: Work<T>): Promise<FormState> {
  let next: Route | null
  try {
    const actor = await currentActor()
    const requestHeaders = await headers()
    requireOwnSite(requestHeaders)
    countRequest(`write:${actor ? `member:${actor.id}` : `address:${clientAddress(requestHeaders)}`}`, env().WRITES_PER_MINUTE, systemClock())
    const context = await contextFor(actor)
    const parsed = schema.safeParse(read(form))
    if (!parsed.success) throw invalid(parsed.error)
    const key = form.get('submission')
    const perform = async () => ({ status: 200, body: JSON.stringify(await run(context, parsed.data)) })
    const answered = route && actor && typeof key === 'string' && /^[\w-]{8,64}$/.test(key)
      ? await once(context, { memberId: actor.id, route: `form ${route}`, key, bodyText: JSON.stringify(parsed.data), otherBody: 'This form was posted before. Open the page anew to post another text; copy yours first.' }, perform)
      : await perform()
    next = JSON.parse(answered.body) as Route | null
  } catch (error) {
    const expected = asAppError(error)
    if (!expected) throw error
    return { message: expected.message, code: expected.code, errors: expected.errors.map((e) => ({ ...e, path: e.path.replace(/^input\./, '') })), values: typedValues(form), ...(expected.current !== undefined ? { current: expected.current } : {}), ...(expected.cautions !== undefined ? { cautions: expected.cautions as Caution[] } : {}) }
  }
  if (next !== null) {
    // Going to a row of the page one is on changes the address only: without this the page would stay as it was.
    refresh()
    redirect(next)
  }
  return { message: '', errors: [], values: {}, done: done ?? 'Done.' }
}

/** The framework lets a request without Origin pass with a warning; a form that writes must come from our own pages. */
function requireOwnSite(requestHeaders: Headers): void {
  const site = requestHeaders.get('sec-fetch-site')
  if (requestHeaders.get('origin') === null && site !== 'same-origin') throw new AppError('forbidden', 'This came from another site. Use our own pages.')
  if (site !== null && site !== 'same-origin') throw new AppError('forbidden', 'This came from another site. Use our own pages.')
}

/** What was typed, by field name; a field that repeats becomes a list. Passwords are never sent back. */
export function typedValues(form: FormData): Record<string, string | string[]> {
  const values: Record<string, string | string[]> = {}
  for (const name of new Set(form.keys())) {
    if (name.startsWith('$ACTION') || name.toLowerCase().includes('password')) continue
    const all = form.getAll(name).filter((v): v is string => typeof v === 'string')
    values[name] = all.length > 1 ? all : (all[0] ?? '')
  }
  return values
}

/** A text field, '' when absent. */
export const field = (form: FormData, name: string): string => {
  const value = form.get(name)
  return typeof value === 'string' ? value : ''
}
/** All values of a repeating field, blanks left out. */
export const fields = (form: FormData, name: string): string[] => form.getAll(name).flatMap((v) => (typeof v === 'string' && v.trim() !== '' ? [v.trim()] : []))
/** A text field, or undefined when blank: for optional fields of strict schemas. */
export const optionalField = (form: FormData, name: string): string | undefined => field(form, name).trim() || undefined
