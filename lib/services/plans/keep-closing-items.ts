// A steward enters what can no longer be reached once a section is closed. Items are ended, never deleted: answers hang on them.
import 'server-only'
import { eq } from 'drizzle-orm'
import { listClosingItems } from '@/db/queries/plans'
import { closingItem } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { AppError, refuse } from '@/lib/errors'
import { closingItemSchema, type ClosingItemInput, type LinesMode } from '@/lib/schemas/plans'
import type { KeptLines } from './kept-lines'
import { readLines } from './read-lines'
import { requireKeeper, requireSection } from './require-section'

export const closingColumns = ['text', 'origin', 'reference'] as const

const keyOf = (item: Pick<ClosingItemInput, 'text' | 'origin'>) => JSON.stringify([item.text, item.origin])

/**
 * Lines of text, origin and reference. One that stands already keeps its id, and so the answers given to it; with 'replace' those that the
 * lines no longer name are ended. 403 for anybody but a steward; nothing changes when no line is good.
 */
export async function keepClosingItems(context: AppContext, place: { kit: string; section: string }, { mode, lines }: { mode: LinesMode; lines: string }): Promise<KeptLines> {
  const { now } = context
  const actor = requireKeeper(context.actor)
  const { good, bad } = readLines(lines, { columns: closingColumns, schema: closingItemSchema })
  return write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const section = await requireSection(tx, place)
    const standing = new Map((await listClosingItems(tx, section.id)).map((item) => [keyOf(item), item.id]))
    const wanted = new Set(good.map((l) => keyOf(l.value)))
    if (mode === 'replace' && good.length > 0) {
      for (const [key, id] of standing) if (!wanted.has(key)) await tx.update(closingItem).set({ endedAt: now }).where(eq(closingItem.id, id))
    }
    const first = mode === 'replace' ? 0 : standing.size
    for (const [i, { value: { reference = '', ...item } }] of good.entries()) {
      const known = standing.get(keyOf(item))
      const row = { reference, position: first + i }
      if (known !== undefined) await tx.update(closingItem).set(row).where(eq(closingItem.id, known))
      else {
        const [made] = await tx.insert(closingItem).values({ ...item, ...row, sectionId: section.id, enteredBy: actor.id, createdAt: now }).returning({ id: closingItem.id })
        if (made) standing.set(keyOf(item), made.id)
      }
    }
    record(good.length > 0 ? `closing-items.${mode}` : 'nothing', `section:${section.id}`, `${good.length} lines`)
    return { kept: good.length, bad }
  })
}

/** Ends one item; 404 when there is none, 409 when it was ended before. */
export async function endClosingItem(context: AppContext, id: number): Promise<void> {
  const actor = requireKeeper(context.actor)
  await write(context.database, { actorId: actor.id, at: context.now }, async (tx, record) => {
    const [found] = await tx.select().from(closingItem).where(eq(closingItem.id, id))
    if (!found) throw refuse.notFound('This item')
    if (found.endedAt !== null) throw new AppError('conflict', 'This item was ended before.', { current: { id } })
    await tx.update(closingItem).set({ endedAt: context.now }).where(eq(closingItem.id, id))
    record('closing-items.end', `closing-item:${id}`)
  })
}
