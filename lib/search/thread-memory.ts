// How much memory this thread has: its heap as the system gave it, and the buffers outside of it.
import 'server-only'
import { getHeapStatistics } from 'node:v8'

/** Megabytes of 10⁶ bytes. */
export function threadMemoryMB(): number {
  const { total_heap_size: heap, external_memory: buffers, malloced_memory: other } = getHeapStatistics()
  return Math.round((heap + buffers + other) / 1e6)
}
