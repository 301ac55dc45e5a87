// Entry of the render thread: scripts/build-workers.mjs bundles it to dist/workers/render.mjs. No I/O but its port.
import { parentPort } from 'node:worker_threads'
import { markdownToHtml } from './markdown-to-html'
import type { RenderReport, RenderRequest } from './messages'

const warmUp = '# a\n\n> - *b* **c** `d` [e](https://example.org) ~~f~~\n\n#30 for 3/16 in, 20-25 in-lb\n\n| g | h |\n| - | - |\n| i | j |\n\n```\nk\n```\n'

function answer(request: RenderRequest): void {
  const html: Record<string, string> = {}
  const plain: Record<string, string> = {}
  let at = ''
  try {
    for (const [field, text] of Object.entries(request.fields)) {
      at = field
      report({ type: 'started', id: request.id, field })
      const rendered = markdownToHtml(text)
      html[field] = rendered.html
      plain[field] = rendered.plain
    }
    report({ type: 'done', id: request.id, html, plain })
  } catch (error) {
    // An exhausted stack ends here: that text is at fault, not the thread.
    report({ type: 'failed', id: request.id, field: at, reason: error instanceof Error ? error.message : String(error) })
  }
}

function report(message: RenderReport): void {
  parentPort?.postMessage(message)
}

// The first text would otherwise pay for compiling the parser, out of a writer's 500 ms.
for (let round = 0; round < 20; round += 1) markdownToHtml(warmUp)
parentPort?.on('message', answer)
report({ type: 'ready' })
