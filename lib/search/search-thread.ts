// One run of the search thread: calls with a time limit, and word of its end. Starting another one is open-search.ts.
import 'server-only'
import { Worker } from 'node:worker_threads'
import { SearchLoadingError, type WhenOrdered } from './messages'
import type { CallName, WorkerCalls, WorkerReply, WorkerRequest } from './worker-messages'

type Answered = Exclude<WorkerReply, { ordered: number[] }>
interface Waiting { resolve(given: Answered): void; reject(error: Error): void; timer: NodeJS.Timeout; whenOrdered: WhenOrdered | undefined }

/** 100,000 entries take some 250 MB of it, and as much again outside; a thread that wants more than this is running away, and is replaced. */
const mostHeapMB = 640

export class SearchThread {
  /** Resolves with the reason when the thread has ended, for whatever reason. */
  readonly lost: Promise<Error>
  private readonly worker: Worker
  private readonly waiting = new Map<number, Waiting>()
  private lastNumber = 0
  private ended = false
  private tellLost: (error: Error) => void = () => undefined

  constructor(workerFile: string) {
    this.lost = new Promise((resolve) => { this.tellLost = resolve })
    // No environment and no flags of the parent: the thread sees no secrets and starts the same under tsx.
    this.worker = new Worker(/* turbopackIgnore: true */ workerFile, { env: {}, execArgv: [], resourceLimits: { maxOldGenerationSizeMb: mostHeapMB } })
    // The thread alone does not keep a process alive; a call that waits does.
    this.worker.unref()
    this.worker.on('message', (reply: WorkerReply) => this.receive(reply))
    this.worker.on('error', (error: Error) => this.finish(error))
    this.worker.on('exit', (code) => this.finish(new Error(`the search thread ended with code ${code}`)))
  }

  /**
   * Asks the thread. Rejects with SearchLoadingError when the thread ends first or does not answer within `timeoutMs`
   * (a thread that hangs is ended), with another error when the call itself failed.
   */
  call<Name extends CallName>(name: Name, asked: WorkerCalls[Name]['asked'], timeoutMs: number, whenOrdered?: WhenOrdered): Promise<WorkerCalls[Name]['given']> {
    if (this.ended) return Promise.reject(new SearchLoadingError())
    const number = ++this.lastNumber
    const reply = new Promise<Answered>((resolve, reject) => {
      const timer = setTimeout(() => void this.end(new Error(`the search thread did not answer "${name}" within ${timeoutMs} ms`)), timeoutMs)
      this.waiting.set(number, { resolve, reject, timer, whenOrdered })
    })
    this.worker.ref()
    this.worker.postMessage({ call: name, number, asked } as WorkerRequest)
    // The number ties a reply to its call, so its shape is that of the call.
    return reply.then((given) => unwrap(given) as WorkerCalls[Name]['given'])
  }

  /** Ends the thread; calls that wait are rejected. */
  async end(reason: Error): Promise<void> {
    this.finish(reason)
    await this.worker.terminate()
  }

  private receive(reply: WorkerReply): void {
    const waiting = this.waiting.get(reply.number)
    if (!waiting) return
    if ('ordered' in reply) {
      waiting.whenOrdered?.(reply.ordered)
      return
    }
    this.waiting.delete(reply.number)
    clearTimeout(waiting.timer)
    if (this.waiting.size === 0) this.worker.unref()
    waiting.resolve(reply)
  }

  private finish(reason: Error): void {
    if (this.ended) return
    this.ended = true
    for (const { reject, timer } of this.waiting.values()) {
      clearTimeout(timer)
      reject(new SearchLoadingError())
    }
    this.waiting.clear()
    this.tellLost(reason)
  }
}

function unwrap(reply: Answered): WorkerCalls[CallName]['given'] {
  if ('failed' in reply) throw new Error(`search failed: ${reply.failed}`)
  return reply.given
}
