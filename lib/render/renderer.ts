// Renders members' texts in a thread of their own with a time limit, so that no text can hold up the server.
// What Markdown becomes is markdown-to-html.ts; keeping the HTML is the caller's.
import 'server-only'
import { Worker } from 'node:worker_threads'
import { normalizeText } from '@/lib/domain/markdown/normalize-text'
import { scanMarkdown } from '@/lib/domain/markdown/scan-markdown'
import type { RenderReport } from './messages'
import { TextRefusedError } from './text-refused-error'

export { TextRefusedError }

export interface RenderedFields { html: Record<string, string>; plain: Record<string, string> }

export interface Renderer {
  /**
   * Renders each of `fields` (normalised first). Rejects with TextRefusedError, naming the field, when one
   * of them holds too much or takes too long; with another error when the thread cannot run at all.
   */
  render(fields: Record<string, string>): Promise<RenderedFields>
  /** Ends the thread; what still waits is rejected. */
  close(): Promise<void>
}

interface Job { id: number; fields: Record<string, string>; field: string; resolve(result: RenderedFields): void; reject(error: Error): void }

const tooSlow = 'The text takes too long to lay out. Use fewer marks and shorter lists, or split it in two.'

/**
 * `workerFile` is the bundle dist/workers/render.mjs. One thread works through a queue; a text over
 * `timeoutMs` loses its thread, and the next one begins on a new thread. The thread starts with the first
 * text and does not keep the process alive when it has nothing to do.
 */
export function createRenderer({ workerFile, timeoutMs = 500 }: { workerFile: string; timeoutMs?: number }): Renderer {
  return new RenderThread(workerFile, timeoutMs)
}

class RenderThread implements Renderer {
  private worker: Worker | null = null
  private ready = false
  private closed = false
  private current: Job | null = null
  private readonly queue: Job[] = []
  private timer: NodeJS.Timeout | undefined
  private lastId = 0

  constructor(private readonly workerFile: string, private readonly timeoutMs: number) {}

  async render(fields: Record<string, string>): Promise<RenderedFields> {
    const normal: Record<string, string> = {}
    for (const [field, text] of Object.entries(fields)) {
      normal[field] = normalizeText(text)
      const scan = scanMarkdown(normal[field])
      if (!scan.ok) throw new TextRefusedError(field, scan.message)
    }
    if (this.closed) throw new Error('the renderer is closed')
    return new Promise((resolve, reject) => {
      this.lastId += 1
      this.queue.push({ id: this.lastId, fields: normal, field: Object.keys(normal)[0] ?? '', resolve, reject })
      this.next()
    })
  }

  async close(): Promise<void> {
    this.closed = true
    const worker = this.worker
    this.stopThread()
    this.failAll(new Error('the renderer is closed'))
    await worker?.terminate()
  }

  private next(): void {
    if (this.current || this.closed) return
    const job = this.queue[0]
    if (!job) {
      this.worker?.unref()
      return
    }
    const worker = this.worker ?? this.startThread()
    worker.ref()
    if (!this.ready) return
    this.queue.shift()
    this.current = job
    this.timer = setTimeout(() => this.checkTime(job), this.timeoutMs)
    worker.postMessage({ id: job.id, fields: job.fields })
  }

  private startThread(): Worker {
    // No environment and no flags of the parent: the thread sees no secrets and starts the same under tsx.
    const worker = new Worker(/* turbopackIgnore: true */ this.workerFile, { env: {}, execArgv: [], resourceLimits: { maxOldGenerationSizeMb: 192 } })
    this.worker = worker
    this.ready = false
    worker.on('message', (report: RenderReport) => { if (this.worker === worker) this.receive(report) })
    worker.on('error', (error) => { if (this.worker === worker) this.lost(error) })
    worker.on('exit', () => { if (this.worker === worker) this.lost(new Error('the render thread ended')) })
    return worker
  }

  private receive(report: RenderReport): void {
    if (report.type === 'ready') {
      this.ready = true
      this.next()
      return
    }
    const job = this.current
    if (!job || report.id !== job.id) return
    switch (report.type) {
      case 'started':
        job.field = report.field
        return
      case 'done':
        this.finish()
        job.resolve({ html: report.html, plain: report.plain })
        return
      case 'failed':
        this.finish()
        job.reject(new TextRefusedError(report.field, `The text cannot be laid out (${report.reason}). Use fewer marks, or split it in two.`))
        return
      default:
        report satisfies never
    }
  }

  private finish(): void {
    clearTimeout(this.timer)
    this.current = null
    // After the promise is settled, so that a caller waiting in line sees its answer first.
    queueMicrotask(() => this.next())
  }

  private checkTime(job: Job): void {
    // When this thread itself was held up, the answer may have come in already: one turn to read it.
    setImmediate(() => {
      if (this.current !== job) return
      const worker = this.worker
      this.stopThread()
      void worker?.terminate()
      this.finish()
      job.reject(new TextRefusedError(job.field, tooSlow))
    })
  }

  /** The thread died. With a text in work the text did it (out of memory); before that nothing can be rendered at all. */
  private lost(error: Error): void {
    const job = this.current
    const wasReady = this.ready
    this.stopThread()
    if (job) {
      this.finish()
      job.reject(new TextRefusedError(job.field, tooSlow))
    } else if (!wasReady) {
      this.failAll(new Error(`the render thread does not start (${this.workerFile}): run \`npm run build:workers\``, { cause: error }))
    }
  }

  private stopThread(): void {
    this.worker = null
    this.ready = false
  }

  private failAll(error: Error): void {
    clearTimeout(this.timer)
    const jobs = this.current ? [this.current, ...this.queue] : [...this.queue]
    this.current = null
    this.queue.length = 0
    for (const job of jobs) job.reject(error)
  }
}
