// Sign-in with e-mail and password. Attempts are counted in the database, so a restart does not forget them.
import 'server-only'
import { inArray, lt } from 'drizzle-orm'
import { attempt } from '@/db/schema'
import { countAttempts, getMemberByEmail } from '@/db/queries/people'
import { writeQuietly } from '@/db/transaction'
import { passwordFits } from '@/lib/auth/password'
import type { AppContext } from '@/lib/context'
import { env } from '@/lib/env'
import { AppError } from '@/lib/errors'

const windowMs = 15 * 60 * 1000

/**
 * The member who may sign in. Refuses with one sentence whatever was wrong, so that nobody learns who has an account;
 * 429 after too many attempts for one address and e-mail.
 */
export async function authenticate(context: AppContext, input: { email: string; password: string; address: string }) {
  const email = input.email.trim().toLowerCase().slice(0, 320)
  const keys = [`address:${input.address}`, `email:${email}`]
  const most = env().SIGN_INS_PER_QUARTER_HOUR
  // Counted before the password is looked at, in one transaction: a hundred tries at once are a hundred tries.
  await writeQuietly(context.database, async (tx) => {
    await tx.delete(attempt).where(lt(attempt.at, context.now - windowMs))
    for (const key of keys) {
      if ((await countAttempts(tx, key, context.now - windowMs)) >= most) {
        throw new AppError('too-many', 'Too many tries. Wait a quarter of an hour, then try again.', { retryAfterSeconds: windowMs / 1000 })
      }
    }
    await tx.insert(attempt).values(keys.map((key) => ({ key, at: context.now })))
  })
  const found = await getMemberByEmail(context.reader, email)
  const fits = await passwordFits(found?.passwordHash ?? null, input.password.slice(0, 1000))
  if (found && fits && found.state === 'active') {
    await writeQuietly(context.database, (tx) => tx.delete(attempt).where(inArray(attempt.key, keys)))
    return found
  }
  if (found && fits) throw new AppError('forbidden', 'This account is suspended. Ask a steward of your group.')
  throw new AppError('unauthenticated', 'E-mail and password do not fit together.')
}
