// A feed's response: open to those who may read, counted like every read.
import 'server-only'
import { headers } from 'next/headers'
import { currentActor } from '@/lib/auth/current-user'
import { systemClock } from '@/lib/clock'
import { contextFor, type AppContext } from '@/lib/context'
import { env } from '@/lib/env'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { clientAddress } from './client-address'
import { asAppError, problem } from './problem'
import { countRequest } from './rate-limit'

/** Sends what `make` gives as Atom; null is 404, a refusal a problem. */
export async function feedResponse(make: (context: AppContext) => Promise<string | null>): Promise<Response> {
  try {
    const context = await contextFor(await currentActor())
    countRequest(`read:address:${clientAddress(await headers())}`, env().READS_PER_MINUTE, systemClock())
    if (!can(context.actor, 'read', { publicReading: context.publicReading })) throw refuse.signIn()
    const xml = await make(context)
    if (xml === null) throw refuse.notFound('This feed')
    return new Response(xml, { headers: { 'content-type': 'application/atom+xml; charset=utf-8', 'cache-control': 'no-store' } })
  } catch (error) {
    const expected = asAppError(error)
    if (!expected) throw error
    return problem(expected)
  }
}
