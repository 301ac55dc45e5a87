// Brings a post's cached judgement (stamp state, whether two stamps are needed) up to what its rows say.
// Shared by every service that writes something a stamp depends on; pure rules stand in lib/domain.
import 'server-only'
import { getCautionedPost, type CautionedPost } from '@/db/queries/cautioned-post'
import { setJudgement } from '@/db/mutations/posts'
import type { Transaction } from '@/db/client'
import { cautionTable } from '@/lib/content/caution-table'
import { judgeStamps, type Judgement } from '@/lib/domain/stamps/stamp-state'

const needsTwoByCode = new Map(cautionTable.cautions.map((c) => [c.code, c.twoStamps]))

/** Two stamps are needed while a caution of a critical system stands on the post. */
export function needsTwoStamps(found: CautionedPost): boolean {
  return found.cautions.some((c) => c.waivedAt === null && needsTwoByCode.get(c.code) === true)
}

/** State, what is missing and where the plans changed, from the rows of a post and the current revision of its question (0 for an entry). */
export function judge(found: CautionedPost, questionRevision: number): Judgement {
  return judgeStamps({
    currentRevision: found.current.number, questionRevision, needsTwo: needsTwoStamps(found), postState: found.state,
    authorIds: found.authorIds, stamps: found.stamps, revisedAt: found.current.createdAt, plans: found.plans, bulletins: found.bulletins,
    failuresAt: found.outcomes.filter((o) => o.result === 'did-not-work' && o.revision === found.current.number).map((o) => o.createdAt),
  })
}

/** Recomputes and stores the judgement of one post. Call last in a transaction that touched it. */
export async function judgePost(tx: Transaction, postId: number): Promise<void> {
  const found = await getCautionedPost(tx, postId)
  if (!found) throw new Error(`No post ${postId} to judge`)
  const parent = found.parentId === null ? null : await getCautionedPost(tx, found.parentId)
  const judgement = { stampState: judge(found, parent?.current.number ?? 0).state, needsTwo: needsTwoStamps(found) }
  // An update that changes nothing would still send search to read the entry again.
  if (judgement.stampState !== found.stampState || judgement.needsTwo !== found.needsTwo) await setJudgement(tx, postId, judgement)
}
