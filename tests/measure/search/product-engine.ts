// The product's own door: the bundled thread, filled from the installation's file and following its change log.
import path from 'node:path'
import { openDatabase } from '@/db/client'
import { SearchLoadingError } from '@/lib/search/messages'
import { openSearch } from '@/lib/search/open-search'
import { workerFile } from '@/lib/worker-file'
import { hitsWanted, type EngineTask, type Start } from './engine'

/** Builds the index from the tables, waits until it is saved, and starts again from what was saved: that one answers. */
export async function startProduct({ databaseFile, directory }: EngineTask): Promise<Start> {
  const database = await openDatabase(databaseFile)
  const folder = path.join(directory, 'search')
  // Saved again after few changes, so that one snapshot is written while the questions are asked and entries come in.
  const open = () => openSearch({ database, workerFile: workerFile('search'), onError, snapshots: { folder, changes: 100, restMs: 0 } })
  const built = open()
  const buildSeconds = await secondsUntil(() => built.health().state === 'ready')
  await secondsUntil(() => built.health().snapshot !== undefined)
  const { snapshot, memoryMB } = built.health()
  await built.close()
  const door = open()
  const startSeconds = await secondsUntil(() => door.health().state === 'ready')
  const { startedFrom, memoryMB: restoredMB } = door.health()
  return {
    buildSeconds, startSeconds: startedFrom === 'snapshot' ? startSeconds : 'the snapshot was refused',
    indexMB: { built: memoryMB, restored: restoredMB, saving: snapshot?.highestMemoryMB ?? 0 }, saveSeconds: snapshot?.seconds ?? 0,
    engine: {
      fileMB: snapshot?.MB ?? null,
      ask: async ({ text, kit }) => (await door.search({ text, filters: { kit }, limit: hitsWanted, offset: 0 })).hits.map(({ id }) => id),
      close: async () => { await door.close(); database.close() },
    },
  }
}

async function secondsUntil(isSo: () => boolean): Promise<number> {
  const begun = performance.now()
  while (!isSo()) await new Promise((resolve) => setTimeout(resolve, 20))
  return (performance.now() - begun) / 1000
}

/** What a closing door tells of calls that still waited is no fault. */
function onError(error: unknown): void {
  if (!(error instanceof SearchLoadingError)) console.error(error)
}
