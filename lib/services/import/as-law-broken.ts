// Tells a broken law of the data (db/laws.sql, constraints) from a broken database, in words for the person who imports.
import 'server-only'

/** The law in words, or null when the error is something else. */
export function asLawBroken(error: unknown): string | null {
  for (let e: unknown = error; e instanceof Error; e = e.cause) {
    const law = /law: ([^\n]+)/.exec(e.message)?.[1]
    if (law !== undefined) return `This breaks a law of the data: ${law}.`
    if ('code' in e && typeof e.code === 'string' && e.code.startsWith('SQLITE_CONSTRAINT')) return 'This line does not fit what is here already.'
  }
  return null
}
