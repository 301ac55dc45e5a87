// The kits and operations a new installation begins with.
import 'server-only'
import { count } from 'drizzle-orm'
import type { Database } from '@/db/client'
import { kit, operation, section, task } from '@/db/schema'
import { write } from '@/db/transaction'
import { demoContent } from '@/lib/content/demo-content'

/** Kits, sections, operations and tasks into a database without kits; false when there are some. */
export async function seedPlaces(database: Database, at: number): Promise<boolean> {
  const [kits] = await database.reader.select({ n: count() }).from(kit)
  if (!kits || kits.n > 0) return false
  await write(database, { actorId: null, at }, async (tx, record) => {
    for (const k of demoContent.kits) {
      const [row] = await tx.insert(kit).values({ slug: k.slug, name: k.name, maker: k.maker }).returning({ id: kit.id })
      if (!row) throw new Error('The kit was not inserted')
      await tx.insert(section).values(k.sections.map((s, position) => ({ kitId: row.id, code: s.code, title: s.title, jasc: s.jasc, position })))
      record('kit.seed', `kit:${row.id}`)
    }
    for (const [position, o] of demoContent.operations.entries()) {
      const [row] = await tx.insert(operation).values({ slug: o.slug, title: o.title, position }).returning({ id: operation.id })
      if (row && o.tasks.length) await tx.insert(task).values(o.tasks.map((t, i) => ({ operationId: row.id, slug: t.slug, title: t.title, position: i })))
    }
  })
  return true
}
