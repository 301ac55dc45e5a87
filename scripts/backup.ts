// npm run db:backup -- FILE
import path from 'node:path'
import { backUp } from '../db/backup'
import { openDatabase } from '../db/client'
import { env } from '../lib/env'

const file = process.argv[2]
if (!file) {
  console.error('Say where: npm run db:backup -- FILE')
  process.exit(1)
}
const database = await openDatabase(env().databaseFile)
await backUp(database, path.resolve(file))
database.close()
console.log(`Backed up to ${path.resolve(file)}`)
