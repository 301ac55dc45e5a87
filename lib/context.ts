// What every service takes: who asks, when, and the doors of this process. Built once a request.
import 'server-only'
import type { Database, Reader } from '@/db/client'
import { systemClock } from './clock'
import { env } from './env'
import type { Actor } from './policy/actor'
import type { Renderer } from './render/renderer'
import { runtime } from './runtime'
import type { SearchDoor } from './search/messages'

export interface AppContext {
  readonly database: Database
  readonly reader: Reader
  readonly actor: Actor
  /** UTC milliseconds of this request. */
  readonly now: number
  readonly search: SearchDoor
  readonly renderer: Renderer
  readonly publicReading: boolean
}

/** A context for `actor` in this process. */
export async function contextFor(actor: Actor): Promise<AppContext> {
  const { database, search, renderer } = await runtime()
  return { database, reader: database.reader, actor, now: systemClock(), search, renderer, publicReading: env().PUBLIC_READING }
}
