// Puts changes into the index a few milliseconds at a time, so that a question asked meanwhile waits for no more than one step.
import 'server-only'
import type { SearchIndex } from './search-index'
import type { Changes } from './worker-messages'

const stepMs = 8

/** Applies all of `changes`; removals first, because an id that is removed and put again stands. */
export async function applyInSteps(index: SearchIndex, { put, remove }: Omit<Changes, 'sequence'>): Promise<void> {
  for (const id of remove) index.remove(id)
  let until = performance.now() + stepMs
  for (const document of put) {
    index.put(document)
    if (performance.now() < until) continue
    await new Promise((resolve) => setImmediate(resolve))
    until = performance.now() + stepMs
  }
}
