'use server'
// Form actions under a post: remarks, how it went, going by it. Stamps and moderation have files of their own.
import { refresh } from 'next/cache'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { newRemarkSchema, outcomeInputSchema } from '@/lib/schemas/acts'
import { idText } from '@/lib/schemas/text'
import { addRemark } from '@/lib/services/entries/add-remark'
import { goBy } from '@/lib/services/outcomes/go-by'
import { tellHowItWent } from '@/lib/services/outcomes/tell-how-it-went'
import { paths } from '@/lib/paths'
import { z } from 'zod'

const withPost = <T extends z.ZodType>(input: T) => z.object({ postId: idText, input })

export async function remarkAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'remark', schema: withPost(newRemarkSchema), read: (f) => ({ postId: field(f, 'postId'), input: { body: field(f, 'body') } }),
    run: async (context, { postId, input }) => {
      const made = await addRemark(context, postId, input)
      return paths.remark(made.entryId, made.id)
    },
  })
}

export async function outcomeAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: withPost(outcomeInputSchema), read: (f) => ({ postId: field(f, 'postId'), input: { result: field(f, 'result'), note: field(f, 'note') } }),
    run: async (context, { postId, input }) => paths.entry((await tellHowItWent(context, postId, input)).entryId, postId),
  })
}

export async function relianceAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, on: z.enum(['0', '1']) }), read: (f) => ({ postId: field(f, 'postId'), on: field(f, 'on') }),
    run: async (context, { postId, on }) => {
      await goBy(context, postId, on === '1')
      refresh()
      return null
    },
  })
}
