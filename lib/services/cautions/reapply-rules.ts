// Runs the rule table again over everything when its version changed: what is newly required is attached as added later.
import 'server-only'
import { count, eq } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import { listEntryIdsFrom } from '@/db/queries/search'
import { post, setting } from '@/db/schema'
import { write, writeQuietly } from '@/db/transaction'
import { cautionTable } from '@/lib/content/caution-table'
import { attachCautions, cautionsOfEntry } from '@/lib/services/posts/attach-cautions'
import { judgePost } from '@/lib/services/posts/judge-post'
import { rejudgeAnswers } from '@/lib/services/posts/rejudge-answers'

const key = 'cautions-version'
/** Few a transaction, so that readers and writers get in between. */
const entriesATime = 5

/** In a database without posts there is nothing to run again: its first posts are judged by the table of today. */
export async function noteRulesVersion(database: Database): Promise<void> {
  const [posts] = await database.reader.select({ n: count() }).from(post)
  if (posts?.n === 0) await writeQuietly(database, keepVersion)
}

/** Returns how many entries got a caution. Does nothing when the posts were judged by this version already. */
export async function reapplyRules(database: Database, now: number): Promise<number> {
  const [kept] = await database.reader.select().from(setting).where(eq(setting.key, key))
  if (kept?.value === String(cautionTable.version)) return 0
  let [after, changed] = [0, 0]
  for (;;) {
    const ids = await listEntryIdsFrom(database.reader, after, entriesATime)
    const last = ids.at(-1)
    if (last === undefined) break
    changed += await write(database, { actorId: null, at: now }, async (tx, record) => {
      let n = 0
      for (const id of ids) if (await reapply(tx, id, now)) { record('cautions.reapply', `post:${id}`, String(cautionTable.version)); n++ }
      if (n === 0) record('nothing', `post:${last}`)
      return n
    })
    after = last
  }
  await writeQuietly(database, keepVersion)
  return changed
}

async function reapply(tx: Transaction, id: number, now: number): Promise<boolean> {
  const found = await getCautionedPost(tx, id)
  if (!found || found.kind === 'answer') return false
  const added = await attachCautions(tx, id, cautionsOfEntry(found.kind, found.current, found.sections.flatMap((s) => s.jasc ?? [])), 'added-later', now)
  await judgePost(tx, id)
  const inAnswers = found.kind === 'question' ? await rejudgeAnswers(tx, id, now) : 0
  return added + inAnswers > 0
}

async function keepVersion(tx: Transaction): Promise<void> {
  const value = String(cautionTable.version)
  await tx.insert(setting).values({ key, value }).onConflictDoUpdate({ target: setting.key, set: { value } })
}
