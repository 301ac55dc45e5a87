// Whether this installation can serve. Search that still loads is no failure: everything else works.
import 'server-only'
import { sql } from 'drizzle-orm'
import { expectedSchema } from '@/db/migrate'
import type { AppContext } from '@/lib/context'
import { logError } from '@/lib/log'
import type { Health } from '@/lib/schemas/health'
import manifest from '@/package.json'

/** Never throws for a database that cannot be read: that is what it reports. */
export async function checkHealth(context: AppContext): Promise<Health> {
  const db = await context.reader.run(sql`select 1`).then(() => 'ok' as const, (error: unknown) => {
    logError('health', error)
    return 'failing' as const
  })
  return { status: db, version: manifest.version, schema: expectedSchema().tag, db, search: context.search.health(), mail: 'none', storage: 'none' }
}
