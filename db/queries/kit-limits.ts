// The kit makers' own limits. Ended ones stay, and are only listed where a person reads them.
import 'server-only'
import { and, asc, desc, eq, exists, isNull, or } from 'drizzle-orm'
import type { ReaderOrTransaction } from '../client'
import { kit, kitLimit, member } from '../schema'

/** A kit's limits in force, for one shop table or for all, oldest first; null when there is no such kit. One query over the index. */
export async function listLimitsInForce(reader: ReaderOrTransaction, slug: string, table?: string) {
  const rows = await reader.select({ kit, limit: kitLimit }).from(kit)
    .leftJoin(kitLimit, and(eq(kitLimit.kitId, kit.id), isNull(kitLimit.endedAt), table === undefined ? undefined : eq(kitLimit.table, table)))
    .where(eq(kit.slug, slug)).orderBy(asc(kitLimit.id))
  const [first] = rows
  return first ? { kit: first.kit, limits: rows.flatMap((row) => row.limit ?? []) } : null
}

/** Every limit of a kit with who entered it, the newest first. */
export async function listLimitRecords(reader: ReaderOrTransaction, kitId: number) {
  return reader.select({ limit: kitLimit, enteredBy: { id: member.id, name: member.name } }).from(kitLimit)
    .leftJoin(member, eq(member.id, kitLimit.enteredBy)).where(eq(kitLimit.kitId, kitId)).orderBy(desc(kitLimit.id))
}

export async function getLimit(reader: ReaderOrTransaction, id: number) {
  const [row] = await reader.select({ limit: kitLimit, kit: kit.slug }).from(kitLimit).innerJoin(kit, eq(kit.id, kitLimit.kitId)).where(eq(kitLimit.id, id))
  return row ?? null
}

/** Kits that have a limit in force: only these are worth choosing at a shop table. And `also`, which was chosen already. */
export async function listKitsWithLimits(reader: ReaderOrTransaction, also = '') {
  const inForce = reader.select({ id: kitLimit.id }).from(kitLimit).where(and(eq(kitLimit.kitId, kit.id), isNull(kitLimit.endedAt)))
  return reader.select({ slug: kit.slug, name: kit.name, maker: kit.maker }).from(kit).where(or(exists(inForce), eq(kit.slug, also))).orderBy(asc(kit.id))
}
