// The law that the last steward stays is kept by a trigger; here its refusal is put into words.
import 'server-only'
import { AppError } from '@/lib/errors'

/** Runs a write on a member; the trigger's refusal becomes a 409 that says what to do first. */
export async function keepingLastSteward<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work()
  } catch (error) {
    if (breaksLaw(error, 'law: the last steward')) {
      throw new AppError('conflict', 'This is the last steward. Make somebody else a steward first: an installation without one could not be looked after.')
    }
    throw error
  }
}

/** Whether a trigger's message stands anywhere in the chain of causes: drizzle wraps the driver's error. */
function breaksLaw(error: unknown, law: string): boolean {
  for (let e: unknown = error; e instanceof Error; e = e.cause) if (e.message.includes(law)) return true
  return false
}
