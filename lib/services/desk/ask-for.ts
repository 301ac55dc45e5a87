// A mentor asks the author for what is missing before a stamp. The post leaves the rail until its author answers.
import 'server-only'
import { askedFor } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { AskFor } from '@/lib/schemas/acts'
import { requirePost } from '@/lib/services/posts/require-post'

/** Returns the entry the post stands in. Asking for the same again while it is open is once. 403 as the policy says. */
export async function askFor(context: AppContext, postId: number, input: AskFor): Promise<{ entryId: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  return write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const { entryId, subject } = await requirePost(tx, actor, postId)
    if (!can(actor, 'post.ask-for', subject)) throw refuse.forbidden(whyNot['post.ask-for'])
    const made = await tx.insert(askedFor).values({ postId, mentorId: actor.id, what: input.what, createdAt: now }).onConflictDoNothing().returning({ id: askedFor.id })
    record(made.length ? 'post.ask-for' : 'nothing', `post:${postId}`, input.what)
    return { entryId }
  })
}
