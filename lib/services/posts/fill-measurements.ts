// Finds the measurements of posts that an older parser measured, or none: after an upgrade, beside the first requests.
// Until a post's turn comes its measurements are found when it is read (present-post.ts).
import 'server-only'
import { listCautionedPosts, type CautionedPost } from '@/db/queries/cautioned-post'
import { listUnmeasuredIds } from '@/db/queries/measurements'
import { writeQuietly } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { parserVersion } from '@/lib/domain/measurements/measurement'
import { AppError } from '@/lib/errors'
import { withRenderings } from './load-entry'
import { saveMeasurements } from './save-text'

type Doors = Pick<AppContext, 'database' | 'renderer'>

/** Few a transaction, so that readers and writers get in between. */
const postsATime = 5

/**
 * Returns how many posts were measured. Safe to run again, and in two processes at once: a post measured twice holds the same rows,
 * and one that was edited meanwhile has been measured by its edit.
 */
export async function fillMeasurements(doors: Doors): Promise<number> {
  const { reader } = doors.database
  let measured = 0
  for (let after = 0; ;) {
    const ids = await listUnmeasuredIds(reader, parserVersion, after, postsATime)
    const last = ids.at(-1)
    if (last === undefined) return measured
    measured += await measure(doors, await listCautionedPosts(reader, ids, 'plain'))
    after = last
  }
}

async function measure(doors: Doors, posts: readonly CautionedPost[]): Promise<number> {
  const rendered = await Promise.all(posts.filter((found) => found.plain === null).map((found) => renderAndMeasure(doors, found)))
  const stored = await writeQuietly(doors.database, async (tx) => {
    let n = 0
    for (const { id, plain, current } of posts) if (plain !== null && (await saveMeasurements(tx, id, current.number, plain))) n++
    return n
  })
  return stored + rendered.filter(Boolean).length
}

/** Keeping a rendering measures the post. A text that cannot be rendered waits for its author, and does not keep the others waiting. */
async function renderAndMeasure(doors: Doors, found: CautionedPost): Promise<boolean> {
  try {
    await withRenderings(doors, [found])
    return true
  } catch (error) {
    if (error instanceof AppError) return false
    throw error
  }
}
