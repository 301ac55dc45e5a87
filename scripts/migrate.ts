// npm run db:migrate: brings the database to this version's schema and laws. Back up first.
import { mkdirSync } from 'node:fs'
import { openDatabase } from '../db/client'
import { expectedSchema, migrateDatabase } from '../db/migrate'
import { env } from '../lib/env'

mkdirSync(env().dataDirectory, { recursive: true })
const database = await openDatabase(env().databaseFile)
await migrateDatabase(database)
database.close()
console.log(`Schema ${expectedSchema().tag} in ${env().dataDirectory}`)
