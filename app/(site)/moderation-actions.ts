'use server'
// Form actions of moderators on a post: cautions, hiding and restoring.
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { addCautionSchema, mergeEntrySchema, setStateSchema, waiveCautionSchema } from '@/lib/schemas/acts'
import { idText } from '@/lib/schemas/text'
import { addCaution } from '@/lib/services/cautions/add-caution'
import { waiveCaution } from '@/lib/services/cautions/waive-caution'
import { mergeEntry } from '@/lib/services/moderation/merge-entry'
import { setPostState } from '@/lib/services/moderation/set-post-state'

export async function addCautionAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, input: addCautionSchema }), read: (f) => ({ postId: field(f, 'postId'), input: { code: field(f, 'code'), because: field(f, 'because') } }),
    run: async (context, { postId, input }) => paths.entry((await addCaution(context, postId, input)).entryId, postId),
  })
}

export async function waiveCautionAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, input: waiveCautionSchema }), read: (f) => ({ postId: field(f, 'postId'), input: { code: field(f, 'code'), reason: field(f, 'reason') } }),
    run: async (context, { postId, input }) => paths.entry((await waiveCaution(context, postId, input)).entryId, postId),
  })
}

export async function setStateAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, input: setStateSchema }), read: (f) => ({ postId: field(f, 'postId'), input: { state: field(f, 'state'), reason: field(f, 'reason') } }),
    run: async (context, { postId, input }) => paths.entry((await setPostState(context, postId, input)).entryId, postId),
  })
}

export async function mergeEntryAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, input: mergeEntrySchema }), read: (f) => ({ postId: field(f, 'postId'), input: { into: field(f, 'into'), reason: field(f, 'reason') } }),
    run: async (context, { postId, input }) => paths.entry((await mergeEntry(context, postId, input)).entryId),
  })
}
