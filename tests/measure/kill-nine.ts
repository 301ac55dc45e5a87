// kill -9 in the middle of a burst of writes: after a restart everything acknowledged is there, the file is sound,
// the index and the tables agree, and the audit chain holds.
import { inArray } from 'drizzle-orm'
import { checkAudit } from '@/db/check-audit'
import type { Database } from '@/db/client'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { countVisibleEntries, currentSequence } from '@/db/queries/search'
import { remark } from '@/db/schema'
import { searchResultSchema } from '@/lib/schemas/search'
import { startBurst, type Acknowledged } from './burst'
import { round } from './percentiles'
import { startProduction, type ProductionProcess } from './production-process'
import type { Measured, Result } from './result'
import { seededRandom } from './seeded-random'
import { openInstallation, tokenOf, withDatabase } from './temporary-installation'

export interface KillOptions { rounds: number; writers: number; seed?: number }
/** What one round found wrong; all zero when nothing is. */
export interface Found { acknowledged: number; refused: string[]; lost: number; notFound: number; unsound: string[]; disagreements: string[]; auditBrokenAt: number | null; restartMs: number }

const longestBurstMs = 2500

/** Kills as often as `rounds` says, on one installation that grows from round to round. */
export async function measureKill({ rounds, writers, seed = Date.now() % 1_000_000 }: KillOptions): Promise<Result> {
  const found: Found[] = []
  const chance = seededRandom(seed)
  const installation = await openInstallation()
  try {
    const token = await tokenOf(installation)
    let server = await startProduction(installation.directory)
    try {
      for (let i = 0; i < rounds; i++) {
        const burst = startBurst(server.address, token, writers, chance)
        await burst.begun
        await new Promise((resolve) => setTimeout(resolve, chance.below(longestBurstMs)))
        await server.end('SIGKILL')
        await burst.done
        server = await startProduction(installation.directory)
        const after = await withDatabase(installation.databaseFile, (database) => examine(database, server, burst.acknowledged))
        found.push({ ...after, refused: burst.refused, restartMs: server.readyMs })
      }
    } finally {
      await server.end('SIGTERM')
    }
  } finally {
    installation.remove()
  }
  return { name: 'kill', measured: measuredOf(found), detail: { seed, rounds: found } }
}

function measuredOf(found: readonly Found[]): Measured[] {
  const sum = (of: (one: Found) => number) => found.reduce((total, one) => total + of(one), 0)
  const none = (what: string, value: number): Measured => ({ what, value, unit: '', promised: 0 })
  return [
    { what: `writes acknowledged before ${found.length} kills`, value: sum((f) => f.acknowledged), unit: '', promised: null },
    none('kills before anything was acknowledged', found.filter((f) => f.acknowledged === 0).length),
    none('acknowledged and not there after the restart', sum((f) => f.lost)),
    none('acknowledged and not found by search', sum((f) => f.notFound)),
    none('faults of integrity_check and foreign_key_check', sum((f) => f.unsound.length)),
    none('disagreements of index and tables', sum((f) => f.disagreements.length)),
    none('breaks of the audit chain', found.filter((f) => f.auditBrokenAt !== null).length),
    none('refusals before the kill', sum((f) => f.refused.length)),
    { what: 'slowest restart', value: round(Math.max(0, ...found.map((f) => f.restartMs)) / 1000), unit: 's', promised: null },
  ]
}

async function examine(database: Database, server: ProductionProcess, acknowledged: Acknowledged): Promise<Omit<Found, 'refused' | 'restartMs'>> {
  const { entries, answers, remarks } = acknowledged
  const posts = new Map((await listCautionedPosts(database.reader, [...entries, ...answers].map((e) => e.id))).map((p) => [p.id, p.current]))
  const kept = remarks.length === 0 ? [] : await database.reader.select().from(remark).where(inArray(remark.id, remarks.map((r) => r.id)))
  const bodies = new Map(kept.map((r) => [r.id, r.body]))
  return {
    acknowledged: entries.length + answers.length + remarks.length,
    lost: entries.filter((e) => posts.get(e.id)?.title !== e.title).length + answers.filter((a) => posts.get(a.id)?.body !== a.body).length + remarks.filter((r) => bodies.get(r.id) !== r.body).length,
    notFound: await countNotFound(server, [...entries, ...answers.map((a) => ({ id: a.entryId, word: a.word }))]),
    unsound: await unsoundness(database), disagreements: await disagreements(database, server), auditBrokenAt: (await checkAudit(database.reader)).brokenAt,
  }
}

async function countNotFound({ address }: ProductionProcess, wanted: readonly { id: number; word: string }[]): Promise<number> {
  let missing = 0
  for (const { id, word } of wanted) {
    const { results } = searchResultSchema.parse(await (await fetch(`${address}/api/search?q=${word}`)).json())
    if (!results.some((hit) => hit.id === id)) missing++
  }
  return missing
}

async function unsoundness({ client }: Database): Promise<string[]> {
  const integrity = (await client.execute('PRAGMA integrity_check')).rows.map((row) => String(row['integrity_check'])).filter((line) => line !== 'ok')
  const foreign = (await client.execute('PRAGMA foreign_key_check')).rows.map((row) => `foreign key of ${String(row['table'])} ${String(row['rowid'])}`)
  return [...integrity, ...foreign]
}

async function disagreements({ reader }: Database, server: ProductionProcess): Promise<string[]> {
  const { search } = await server.health()
  const [visible, sequence] = [await countVisibleEntries(reader), await currentSequence(reader)]
  return [
    ...(search.documents === visible ? [] : [`${search.documents} documents for ${visible} visible entries`]),
    ...(search.sequence === sequence ? [] : [`the index stands at ${search.sequence}, the log at ${sequence}`]),
  ]
}
