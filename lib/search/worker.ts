// Entry of the search thread, bundled to dist/workers/search.mjs: holds the index and answers messages. No database; files only of snapshots.
import 'server-only'
import { createHash } from 'node:crypto'
import { readFileSync } from 'node:fs'
import { parentPort } from 'node:worker_threads'
import synonyms from '@/content/synonyms.json'
import { applyInSteps } from './apply-in-steps'
import { SearchIndex } from './search-index'
import { readIndex } from './snapshot/index-snapshot'
import { SnapshotError } from './snapshot/snapshot-file'
import { listSnapshots } from './snapshot/snapshot-folder'
import { SnapshotSaver } from './snapshot/snapshot-saver'
import { threadMemoryMB } from './thread-memory'
import type { Filled, WorkerCalls, WorkerReply, WorkerRequest } from './worker-messages'

const port = parentPort
if (!port) throw new Error('lib/search/worker.ts runs as a worker thread only')

const list = {
  twoWay: synonyms.twoWay,
  oneWay: synonyms.oneWay.map(({ from, to }) => ({ from, to: Array.isArray(to) ? to : [to] })),
}
/** This bundle holds all that makes terms of texts, synonyms and all: what another one wrote was read in another way. */
const thread = createHash('sha256').update(readFileSync(new URL(import.meta.url))).digest('hex').slice(0, 32)
const saver = new SnapshotSaver(thread)
let index = new SearchIndex(list)
let sequence = 0
/** Changes are applied one after the other; questions are answered in between. */
let applying: Promise<void> = Promise.resolve()

port.on('message', (request: WorkerRequest) => {
  const reply = (message: WorkerReply) => port.postMessage(message)
  answer(request).then(
    (given) => reply({ number: request.number, given }),
    (error: unknown) => reply({ number: request.number, failed: error instanceof Error ? (error.stack ?? error.message) : String(error) }),
  )
})

async function answer(request: WorkerRequest): Promise<WorkerCalls[WorkerRequest['call']]['given']> {
  switch (request.call) {
    case 'apply': {
      const done = applying.then(() => applyInSteps(index, request.asked))
      applying = done.catch(() => undefined)
      await done
      sequence = request.asked.sequence
      return filled()
    }
    case 'search': return { ...index.search(request.asked, (ordered) => port?.postMessage({ number: request.number, ordered } satisfies WorkerReply)), sequence }
    case 'similar': return index.similar(request.asked.text, request.asked.filters, request.asked.limit)
    case 'suggest': return index.suggest(request.asked.text, request.asked.limit)
    case 'explain': return index.explain(request.asked)
    case 'memory': return filled()
    case 'listSnapshots': return listSnapshots(request.asked.folder, thread)
    case 'loadSnapshot': return load(request.asked.file)
    case 'writeSnapshot': return saver.write(index, request.asked.temporary)
    case 'sealSnapshot': return { MB: await saver.seal(request.asked.facts, request.asked.folder) }
    default: return request satisfies never
  }
}

/** Takes the index of `file` in place of this one, once all of it was read. */
function load(file: string): Filled | { refused: string } {
  const loaded = new SearchIndex(list)
  try {
    sequence = readIndex(loaded, file).sequence
  } catch (error) {
    if (error instanceof SnapshotError) return { refused: error.message }
    throw error
  }
  index = loaded
  return filled()
}

const filled = (): Filled => ({ documents: index.documents, memoryMB: threadMemoryMB() })
