// Entry of the search thread, bundled to dist/workers/search.mjs: holds the index and answers messages. No database, no files.
import 'server-only'
import { parentPort } from 'node:worker_threads'
import synonyms from '@/content/synonyms.json'
import { applyInSteps } from './apply-in-steps'
import { SearchIndex } from './search-index'
import type { WorkerCalls, WorkerReply, WorkerRequest } from './worker-messages'

const port = parentPort
if (!port) throw new Error('lib/search/worker.ts runs as a worker thread only')

const index = new SearchIndex({
  twoWay: synonyms.twoWay,
  oneWay: synonyms.oneWay.map(({ from, to }) => ({ from, to: Array.isArray(to) ? to : [to] })),
})
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
      return { documents: index.documents }
    }
    case 'search': return { ...index.search(request.asked, (ordered) => port?.postMessage({ number: request.number, ordered } satisfies WorkerReply)), sequence }
    case 'similar': return index.similar(request.asked.text, request.asked.filters, request.asked.limit)
    case 'suggest': return index.suggest(request.asked.text, request.asked.limit)
    case 'explain': return index.explain(request.asked)
    default: return request satisfies never
  }
}
