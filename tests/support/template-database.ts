// Once a run: bundles the workers, and migrates the template that every test copies. Kits and operations are in it; people are not.
import { mkdtempSync, rmSync } from 'node:fs'
import os from 'node:os'
import path from 'node:path'
import { openDatabase } from '@/db/client'
import { migrateDatabase } from '@/db/migrate'
import { buildWorkers } from '@/scripts/build-workers.mjs'
import type { TestProject } from 'vitest/node'
import { addPlaces } from './places'

declare module 'vitest' {
  interface ProvidedContext { templateDatabase: string }
}

export default async function setup(project: TestProject): Promise<() => void> {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'pilothole-test-'))
  const file = path.join(folder, 'template.db')
  const database = await openDatabase(file)
  await migrateDatabase(database)
  await addPlaces(database)
  database.close()
  await buildWorkers()
  project.provide('templateDatabase', file)
  return () => rmSync(folder, { recursive: true, force: true })
}
