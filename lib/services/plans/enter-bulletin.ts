// A steward enters a kit maker's bulletin. In the same transaction the stamps on its steps become plans changed and whoever goes by
// such a post is told.
import 'server-only'
import { and, eq } from 'drizzle-orm'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { listFollowers } from '@/db/queries/notices'
import { listPostsCitingPages } from '@/db/queries/plans'
import { bulletin, bulletinStep, kit, notice } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Transaction } from '@/db/client'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import type { NewBulletin } from '@/lib/schemas/plans'
import { pageName } from '@/lib/domain/stamps/plans-change'
import { plansChanges } from '@/lib/domain/stamps/stamp-state'
import { afterWrite } from '@/lib/services/posts/after-write'
import { judgePost } from '@/lib/services/posts/judge-post'
import { requireKeeper } from './require-section'

/** How many posts it touches and how many builders are told. 404 for an unknown kit, 409 when the kit has a bulletin of this number. */
export async function enterBulletin(context: AppContext, kitSlug: string, input: NewBulletin): Promise<{ id: number; posts: number; told: number }> {
  const { now } = context
  const actor = requireKeeper(context.actor)
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const entered = await insertBulletin(tx, kitSlug, input, { enteredBy: actor.id, createdAt: now })
    const { posts, told } = await applyBulletin(tx, entered, now)
    record('bulletin.enter', `bulletin:${entered.id}`, `${posts} posts, ${told} told`)
    return { id: entered.id, posts, told }
  })
  await afterWrite(context)
  return done
}

/** The rows of a bulletin. Without effect by itself. */
export async function insertBulletin(tx: Transaction, kitSlug: string, { steps, ...input }: NewBulletin, by: { enteredBy: number; createdAt: number }): Promise<{ id: number; kitId: number; number: string }> {
  const [found] = await tx.select({ id: kit.id }).from(kit).where(eq(kit.slug, kitSlug))
  if (!found) throw refuse.notFound('This kit')
  const [before] = await tx.select({ id: bulletin.id }).from(bulletin).where(and(eq(bulletin.kitId, found.id), eq(bulletin.number, input.number)))
  if (before) throw new AppError('conflict', `Bulletin ${input.number} of this kit was entered before.`, { current: { id: before.id }, errors: [{ path: 'number', message: 'This number was entered before.' }] })
  const [row] = await tx.insert(bulletin).values({ ...input, kitId: found.id, ...by }).returning({ id: bulletin.id })
  if (!row) throw new Error('The bulletin was not inserted')
  await tx.insert(bulletinStep).values(steps.map(({ page, step, revision }, position) => ({ bulletinId: row.id, position, page, step: step ?? null, revision: revision ?? '' })))
  return { id: row.id, kitId: found.id, number: input.number }
}

/** Judges anew every post the bulletin touches and tells once whoever goes by a visible one. */
export async function applyBulletin(tx: Transaction, entered: { id: number; kitId: number; number: string }, now: number): Promise<{ posts: number; told: number }> {
  const pages = (await tx.select({ page: bulletinStep.page }).from(bulletinStep).where(eq(bulletinStep.bulletinId, entered.id))).map(({ page }) => pageName(page))
  const citing = await listCautionedPosts(tx, await listPostsCitingPages(tx, entered.kitId, [...new Set(pages)]), 'plain')
  const touched = citing.filter((p) => plansChanges({
    currentRevision: p.current.number, questionRevision: p.question?.currentRevision ?? 0, plans: p.plans, bulletins: p.bulletins.filter((b) => b.id === entered.id), stamps: p.stamps,
  }).length > 0)
  for (const found of touched) await judgePost(tx, found.id)
  const open = touched.filter((p) => p.state === 'visible' && (p.question === null || p.question.state === 'visible'))
  const followers = await listFollowers(tx, open.map((p) => p.id))
  if (followers.length > 0) await tx.insert(notice).values(followers.map((f) => ({ ...f, kind: 'bulletin' as const, bulletinId: entered.id, createdAt: now })))
  return { posts: touched.length, told: new Set(followers.map((f) => f.memberId)).size }
}
