// A personal token: shown once, stored hashed, with its owner's rights.
import 'server-only'
import { token } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Database } from '@/db/client'
import { newToken, tokenHash } from '@/lib/auth/tokens'

/** Makes a token for `memberId`, called `name`, and returns it: the only time it can be read. */
export async function createToken({ database, now }: { database: Database; now: number }, { memberId, name }: { memberId: number; name: string }): Promise<string> {
  const secret = newToken()
  await write(database, { actorId: memberId, at: now }, async (tx, record) => {
    const [row] = await tx.insert(token).values({ memberId, name, hash: tokenHash(secret), createdAt: now }).returning({ id: token.id })
    if (!row) throw new Error('The token was not inserted')
    record('token.create', `token:${row.id}`, `member:${memberId}`)
  })
  return secret
}
