// What a snapshot has to agree with beside its own code: which database, how far its history has come, and what documents are made of beside the log.
import 'server-only'
import { createHash } from 'node:crypto'
import type { Reader } from '@/db/client'
import { listKits, listOperations, listSections } from '@/db/queries/kits'
import { auditHead, currentSequence, databaseIdentity, hasAuditRow } from '@/db/queries/search'
import { documentVersion } from '../build-document'
import type { SnapshotHeader } from './snapshot-header'

/** An entry leaves some three rows in the log: from here on the tables are read in less time than the log. */
const mostBehind = 5_000

/** Facts for a snapshot whose entries were all read before this call. The audit row is read last: it stands for all that was written until then. */
export async function readFacts(reader: Reader): Promise<Pick<SnapshotHeader, 'database' | 'reached' | 'anchor'>> {
  return { database: await databaseIdentity(reader), reached: await currentSequence(reader), anchor: await auditHead(reader) }
}

/** Why a snapshot is not one of this database as it stands, or null when it is. */
export async function refusalOf(header: SnapshotHeader, material: string, reader: Reader): Promise<string | null> {
  if (header.database !== await databaseIdentity(reader)) return 'of another database'
  if (header.material !== material) return 'made with other titles'
  const sequence = await currentSequence(reader)
  if (header.reached > sequence) return 'ahead of the database'
  if (sequence - header.sequence > mostBehind + 2 * header.documents) return 'far behind the database'
  return await hasAuditRow(reader, header.anchor) ? null : 'of another history'
}

/** Titles stand in documents and in no change log: when a steward changes one, everything is read again at the next start. */
export async function hashOfMaterial(reader: Reader): Promise<string> {
  const kits = (await listKits(reader)).map(({ slug, name }) => [slug, name])
  const sections = (await listSections(reader)).map(({ kit, code, title }) => [kit, code, title])
  const operations = (await listOperations(reader)).map(({ slug, title, tasks }) => [slug, title, tasks.map((task) => [task.slug, task.title])])
  return createHash('sha256').update(JSON.stringify([documentVersion, kits, sections, operations])).digest('hex').slice(0, 32)
}
