// What every service does once its write is committed.
import 'server-only'
import type { AppContext } from '@/lib/context'

const longestMs = 1_500

/**
 * Waits until search has seen what was written, so that it is found at once; at most 1.5 s, because the write itself is done
 * and an index that is still loading will find it when it is ready.
 */
export async function afterWrite(context: Pick<AppContext, 'search'>): Promise<void> {
  let timer: ReturnType<typeof setTimeout> | undefined
  const enough = new Promise<void>((resolve) => { timer = setTimeout(resolve, longestMs) })
  // A failure to follow is the search door's to report; the writer's work is not undone by it.
  await Promise.race([context.search.catchUp().catch(() => undefined), enough])
  clearTimeout(timer)
}
