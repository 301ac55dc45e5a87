// A builder tells how it went with advice that somebody else wrote: one report a member and post, on its current revision.
import 'server-only'
import { outcome } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { OutcomeInput } from '@/lib/schemas/acts'
import { judgePost } from '@/lib/services/posts/judge-post'
import { requirePost } from '@/lib/services/posts/require-post'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Replaces what this member told before. Returns the entry it belongs to. */
export async function tellHowItWent(context: AppContext, postId: number, input: OutcomeInput): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  const done = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { found, entryId, subject } = await requirePost(tx, actor, postId)
    if (!can(actor, 'post.tell-how-it-went', subject)) throw refuse.forbidden(whyNot['post.tell-how-it-went'])
    const before = found.outcomes.find((o) => o.memberId === actor.id)
    // Mending the words of the same report does not make it a new one: a mentor may have looked at it meanwhile.
    const isSame = before?.revision === found.current.number && before.result === input.result
    const told = { revision: found.current.number, result: input.result, note: input.note, createdAt: isSame ? before.createdAt : now }
    await tx.insert(outcome).values({ postId, memberId: actor.id, ...told }).onConflictDoUpdate({ target: [outcome.postId, outcome.memberId], set: told })
    await judgePost(tx, postId)
    record('outcome.tell', `post:${postId}`, `${revisionLetter(told.revision)} ${input.result}`)
    return { entryId }
  })
  await afterWrite(context)
  return done
}
