// Reads and writes a minute, for a member or an address. Counted in this process: a limit against haste, not a fortress.
// Sign-in has its own counter in the database.
import 'server-only'
import { AppError } from '@/lib/errors'

interface Window { startedAt: number; count: number }
// On globalThis, because the framework loads modules once a bundle and each would count apart.
const holder = globalThis as unknown as { pilotholeWindows?: Map<string, Window> }
const windows = (holder.pilotholeWindows ??= new Map<string, Window>())
const windowMs = 60_000
const mostKeys = 50_000

export interface RateState { limit: number; remaining: number; resetSeconds: number }

/** Counts one request under `key`; throws 429 with Retry-After past `limit` in a minute. */
export function countRequest(key: string, limit: number, now: number): RateState {
  if (windows.size > mostKeys) for (const [k, w] of windows) if (now - w.startedAt >= windowMs) windows.delete(k)
  const known = windows.get(key)
  const window = known && now - known.startedAt < windowMs ? known : { startedAt: now, count: 0 }
  window.count++
  windows.set(key, window)
  const resetSeconds = Math.ceil((window.startedAt + windowMs - now) / 1000)
  if (window.count > limit) throw new AppError('too-many', `At most ${limit} a minute. Wait ${resetSeconds} s.`, { retryAfterSeconds: resetSeconds })
  return { limit, remaining: limit - window.count, resetSeconds }
}

/** The RateLimit headers of a response. */
export const rateHeaders = (state: RateState) => ({
  'ratelimit-limit': String(state.limit), 'ratelimit-remaining': String(state.remaining), 'ratelimit-reset': String(state.resetSeconds),
})
