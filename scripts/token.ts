// npm run token -- --email E --name N: makes a personal token and prints it, once.
import { parseArgs } from 'node:util'
import { openDatabase } from '../db/client'
import { schemaMismatch } from '../db/migrate'
import { getMemberByEmail } from '../db/queries/people'
import { systemClock } from '../lib/clock'
import { env } from '../lib/env'
import { limits } from '../lib/schemas/text'
import { createToken } from '../lib/services/people/create-token'

const { values: { email, name } } = parseArgs({ options: { email: { type: 'string' }, name: { type: 'string' } } })
const stop = (message: string): never => {
  console.error(message)
  process.exit(1)
}
if (email === undefined || name === undefined || name.trim() === '' || name.length > limits.name) stop('Usage: npm run token -- --email E --name N')
else {
  const database = await openDatabase(env().databaseFile)
  const mismatch = await schemaMismatch(database)
  if (mismatch) stop(mismatch)
  const member = await getMemberByEmail(database.reader, email)
  if (!member || member.state !== 'active') stop(`No active member has the e-mail ${email}.`)
  else console.log(await createToken({ database, now: systemClock() }, { memberId: member.id, name: name.trim() }))
  database.close()
}
