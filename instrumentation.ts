// Runs once when the server starts and must finish before it answers: settings, schema, then the doors open.
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startServer } = await import('@/lib/start-server')
  await startServer()
}

/** The one place where unexpected errors of pages and actions are logged; the error page shows the digest. */
export async function onRequestError(error: unknown, request: { path: string; method: string }, context: { routePath: string }): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  // Imported here, not above: the framework also bundles this file for a runtime without process.
  const { logError } = await import('@/lib/log')
  const digest = error instanceof Error && 'digest' in error ? String(error.digest) : ''
  // The route and not the address: of a visit sheet or a hold tag the address is the key.
  logError('request', error, { method: request.method, route: context.routePath, digest })
}
