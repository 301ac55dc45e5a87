// A member asks a question or writes a lesson.
import 'server-only'
import { insertPost, insertRevision } from '@/db/mutations/posts'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { textFields } from '@/lib/domain/entries/entry-text'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { NewEntry } from '@/lib/schemas/entry-input'
import { acknowledgeCautions, cautionsOfEntry } from '@/lib/services/posts/attach-cautions'
import { contentHash } from '@/lib/services/posts/content-hash'
import { judgePost } from '@/lib/services/posts/judge-post'
import { placeEntry } from '@/lib/services/posts/place-entry'
import { renderText } from '@/lib/services/posts/render-text'
import { saveText } from '@/lib/services/posts/save-text'
import { afterWrite } from '@/lib/services/posts/after-write'

/** Publishes and returns the id. 401 for a visitor; 422 for unknown names, refused text or cautions not acknowledged. */
export async function createEntry(context: AppContext, input: NewEntry): Promise<number> {
  const { actor, now } = context
  if (!actor || !can(actor, 'post.write')) throw refuse.signIn()
  const parts = cleanParts(input.parts)
  const body = input.body ?? ''
  const rendered = await renderText(context.renderer, textFields(input.kind, parts, body))
  const id = await write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    if (!can(actor, 'post.write')) throw refuse.forbidden(whyNot['post.write'])
    const place = await placeEntry(tx, input)
    const judged = {
      title: input.title, kitId: place.kitId, sections: place.sections.map((s) => s.code), tasks: [...new Set(input.tasks)], operations: place.operations,
      hardware: [...new Set(input.hardware)], plans: input.plans, orderAdvice: input.orderAdvice, parts, body,
    }
    const postId = await insertPost(tx, { kind: input.kind, authorId: actor.id, createdAt: now })
    await insertRevision(tx, { postId, number: 1, authorId: actor.id, ...judged, contentHash: contentHash(judged), createdAt: now },
      { sectionIds: place.sections.map((s) => s.id), taskIds: place.taskIds, operationIds: place.operationIds, hardware: judged.hardware })
    await saveText(tx, postId, 1, rendered)
    const required = cautionsOfEntry(input.kind, judged, place.sections.flatMap((s) => s.jasc ?? []))
    await acknowledgeCautions(tx, postId, required, input.acknowledgedCautions, now)
    await judgePost(tx, postId)
    record(`${input.kind}.publish`, `post:${postId}`, 'A')
    return postId
  })
  await afterWrite(context)
  return id
}

/** Parts as they are kept: without the silent ones. */
export function cleanParts(parts: Record<string, string | number | undefined> | undefined): Record<string, string | number> | null {
  if (!parts) return null
  const kept = Object.entries(parts).filter((pair): pair is [string, string | number] => pair[1] !== undefined && pair[1] !== '')
  return Object.fromEntries(kept)
}
