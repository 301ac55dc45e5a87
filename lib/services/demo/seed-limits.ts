// The demo's limits of the kit maker, read as a steward's form is read.
import 'server-only'
import { eq } from 'drizzle-orm'
import type { Database, Transaction } from '@/db/client'
import { kit, kitLimit } from '@/db/schema'
import { write } from '@/db/transaction'
import { demoContent, type DemoLimit } from '@/lib/content/demo-content'
import { readLimit } from '@/lib/domain/shop/read-limit'
import type { SeedPeople } from './seed-entry'

/** `at` turns days before the seed day into a moment. */
export async function seedLimits(database: Database, people: SeedPeople, at: (daysAgo: number) => number): Promise<void> {
  for (const limit of demoContent.limits) {
    const enteredBy = people.get(limit.by)?.id ?? null
    await write(database, { actorId: enteredBy, at: at(limit.day) }, async (tx, record) => {
      const id = await insertLimit(tx, limit, enteredBy, at(limit.day))
      record('limit.enter', `limit:${id}`)
    })
  }
}

async function insertLimit(tx: Transaction, { kit: slug, reference, note, value, ...text }: DemoLimit, enteredBy: number | null, createdAt: number): Promise<number> {
  const read = readLimit({ ...text, value: { number: '', min: '', max: '', words: '', ...value } })
  const [found] = await tx.select({ id: kit.id }).from(kit).where(eq(kit.slug, slug))
  if (!read.ok || !found) throw new Error(`The demo's limit for ${text.table} ${text.result} does not fit`)
  const [row] = await tx.insert(kitLimit).values({ kitId: found.id, ...read.given, inputs: { ...read.given.inputs }, reference, note, enteredBy, createdAt }).returning({ id: kitLimit.id })
  if (!row) throw new Error('The limit was not inserted')
  return row.id
}
