// A steward enters a section's hardware list: what, how many a side, where.
import 'server-only'
import { eq } from 'drizzle-orm'
import { listHardwareItems } from '@/db/queries/plans'
import { hardwareItem } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { hardwareItemSchema, type LinesMode } from '@/lib/schemas/plans'
import type { KeptLines } from './kept-lines'
import { readLines } from './read-lines'
import { requireKeeper, requireSection } from './require-section'

export const hardwareColumns = ['designation', 'length', 'left', 'right', 'place'] as const

/** Lines of designation, length, left, right and place. 403 for anybody but a steward; nothing changes when no line is good. */
export async function keepHardware(context: AppContext, place: { kit: string; section: string }, { mode, lines }: { mode: LinesMode; lines: string }): Promise<KeptLines> {
  const actor = requireKeeper(context.actor)
  const { good, bad } = readLines(lines, { columns: hardwareColumns, schema: hardwareItemSchema })
  return write(context.database, { actorId: actor.id, at: context.now }, async (tx, record) => {
    const section = await requireSection(tx, place)
    if (good.length > 0 && mode === 'replace') await tx.delete(hardwareItem).where(eq(hardwareItem.sectionId, section.id))
    const first = (await listHardwareItems(tx, section.id)).length
    for (const [i, { value: { length = '', place: where = '', ...item } }] of good.entries()) {
      await tx.insert(hardwareItem).values({ ...item, length, place: where, sectionId: section.id, position: first + i })
    }
    record(good.length > 0 ? `hardware.${mode}` : 'nothing', `section:${section.id}`, `${good.length} lines`)
    return { kept: good.length, bad }
  })
}
