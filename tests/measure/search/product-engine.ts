// The product's own door: the bundled thread, filled from the installation's file and following its change log.
import { openDatabase } from '@/db/client'
import { SearchLoadingError } from '@/lib/search/messages'
import { openSearch } from '@/lib/search/open-search'
import { workerFile } from '@/lib/worker-file'
import { hitsWanted, type EngineTask, type Start } from './engine'

export async function startProduct({ databaseFile }: EngineTask): Promise<Start> {
  const begun = performance.now()
  const database = await openDatabase(databaseFile)
  const door = openSearch({ database, workerFile: workerFile('search'), onError })
  while (door.health().state !== 'ready') await new Promise((resolve) => setTimeout(resolve, 20))
  return {
    buildSeconds: (performance.now() - begun) / 1000, startSeconds: startFromSnapshot(),
    engine: {
      ask: async ({ text, kit }) => (await door.search({ text, filters: { kit }, limit: hitsWanted, offset: 0 })).hits.map(({ id }) => id),
      close: async () => { await door.close(); database.close() },
    },
  }
}

/** What a closing door tells of calls that still waited is no fault. */
function onError(error: unknown): void {
  if (!(error instanceof SearchLoadingError)) console.error(error)
}

/** The place for starting from a saved index: closes the door, opens it beside the snapshot, and says how long it took to be ready. */
function startFromSnapshot(): number | string {
  return 'no snapshot yet'
}
