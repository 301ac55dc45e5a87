// What one server process holds open: the database, the search door and the renderer. Opened once, at start.
import 'server-only'
import path from 'node:path'
import { openDatabase, type Database } from '@/db/client'
import { env } from './env'
import { createRenderer, type Renderer } from './render/renderer'
import { logError, logInfo } from './log'
import type { SearchDoor } from './search/messages'
import { openSearch } from './search/open-search'
import { workerFile } from './worker-file'

export interface Runtime { database: Database; search: SearchDoor; renderer: Renderer }

// On globalThis, because the framework bundles instrumentation and routes apart and hot reload would open new files.
const holder = globalThis as unknown as { pilotholeRuntime?: Promise<Runtime> }

/** The open runtime of this process. */
export function runtime(): Promise<Runtime> {
  holder.pilotholeRuntime ??= open()
  return holder.pilotholeRuntime
}

async function open(): Promise<Runtime> {
  const database = await openDatabase(env().databaseFile)
  return {
    database,
    renderer: createRenderer({ workerFile: workerFile('render') }),
    search: openSearch({
      database, workerFile: workerFile('search'), snapshots: { folder: path.join(env().dataDirectory, 'search') },
      onError: (error) => logError('search', error), onEvent: (event, facts) => logInfo(`search.${event}`, facts),
    }),
  }
}
