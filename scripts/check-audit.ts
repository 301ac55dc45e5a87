// npm run check:audit: whether the audit trail holds together. Ends with 1 when it does not.
import { checkAudit } from '../db/check-audit'
import { openDatabase } from '../db/client'
import { env } from '../lib/env'

const database = await openDatabase(env().databaseFile)
const { rows, brokenAt } = await checkAudit(database.reader)
database.close()
console.log(brokenAt === null ? `The audit trail holds: ${rows} rows.` : `The audit trail is broken at row ${brokenAt}, after ${rows} that hold.`)
if (brokenAt !== null) process.exitCode = 1
