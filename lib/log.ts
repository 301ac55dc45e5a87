// One JSON line an event on standard output or error. Never texts, names, addresses or secrets.

type Facts = Record<string, string | number | boolean>

export function logInfo(event: string, facts: Facts = {}): void {
  process.stdout.write(`${JSON.stringify({ at: new Date().toISOString(), level: 'info', event, ...facts })}\n`)
}

/** An unexpected error, once, where it ends. */
export function logError(event: string, error: unknown, facts: Facts = {}): void {
  const stack = error instanceof Error ? (error.stack ?? error.message) : String(error)
  process.stderr.write(`${JSON.stringify({ at: new Date().toISOString(), level: 'error', event, ...facts, stack })}\n`)
}
