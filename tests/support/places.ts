// The kits and operations of the template database. Small and fixed, so that a change of the demo content changes no test.
import type { Database } from '@/db/client'
import { kit, operation, section, task } from '@/db/schema'
import { writeQuietly } from '@/db/transaction'

// JASC codes as in the FAA's Joint Aircraft System/Component code table: 5711 wing spar, 5712 wing ribs, 2810 fuel storage.
export const testKits = [
  { slug: 'whimbrel-2', name: 'Whimbrel 2', maker: 'Saltmarsh Aircraft', sections: [
    { code: 'W-1', title: 'Main spar', jasc: '5711' }, { code: 'W-3', title: 'Wing ribs to spar', jasc: '5712' },
    { code: 'W-6', title: 'Fuel tanks', jasc: '2810' }, { code: 'X-1', title: 'Workshop', jasc: null },
  ] },
  { slug: 'ouzel-3', name: 'Ouzel 3', maker: 'Saltmarsh Aircraft', sections: [{ code: '42', title: 'Floor panels', jasc: null }] },
] as const

export const testOperations = [
  { slug: 'plan', title: 'plan', tasks: [{ slug: 'plan-shop', title: 'set up the shop' }] },
  { slug: 'mark', title: 'mark', tasks: [{ slug: 'mark-part', title: 'mark a part' }, { slug: 'mark-sides', title: 'mark left and right' }] },
  { slug: 'deburr', title: 'deburr', tasks: [{ slug: 'deburr-edges', title: 'deburr edges' }, { slug: 'deburr-holes', title: 'deburr holes' }] },
  { slug: 'rivet', title: 'rivet', tasks: [{ slug: 'rivet', title: 'rivet' }] },
] as const

export async function addPlaces(database: Database): Promise<void> {
  await writeQuietly(database, async (tx) => {
    for (const { sections, ...k } of testKits) {
      const [row] = await tx.insert(kit).values(k).returning({ id: kit.id })
      await tx.insert(section).values(sections.map((s, position) => ({ ...s, kitId: row!.id, position })))
    }
    for (const [position, { tasks, ...o }] of testOperations.entries()) {
      const [row] = await tx.insert(operation).values({ ...o, position }).returning({ id: operation.id })
      await tx.insert(task).values(tasks.map((t, i) => ({ ...t, operationId: row!.id, position: i })))
    }
  })
}
