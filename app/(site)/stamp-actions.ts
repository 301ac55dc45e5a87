'use server'
// Form actions of mentors on a post: press a stamp, withdraw one, ask its author for something. Used on the entry's page and on the desk.
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { askForSchema, withdrawStampSchema } from '@/lib/schemas/acts'
import { sitePath } from '@/lib/schemas/people'
import { stampFormSchema } from '@/lib/schemas/stamp-form'
import { idText } from '@/lib/schemas/text'
import { askFor } from '@/lib/services/desk/ask-for'
import { pressStamp } from '@/lib/services/stamps/press-stamp'
import { withdrawStamp } from '@/lib/services/stamps/withdraw-stamp'

const stampFields = ['postId', 'revision', 'basis', 'page', 'step', 'plansRevision', 'edition', 'paragraph', 'build', 'builtWhen', 'replyDate', 'scope', 'conflictReason'] as const

/** Where the form wants to go on: the desk's next tag; else the post. */
const backTo = (form: FormData, entryId: number, postId: number) => sitePath(field(form, 'returnTo')) ?? paths.entry(entryId, postId)

export async function pressStampAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'press-stamp', schema: stampFormSchema,
    read: (f) => ({ ...Object.fromEntries(stampFields.map((name) => [name, field(f, name)])), beforeMe: field(f, 'beforeMe') === 'yes' }),
    run: async (context, { postId, stamp }) => backTo(form, (await pressStamp(context, postId, stamp)).entryId, postId),
  })
}

export async function withdrawStampAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ stampId: idText, input: withdrawStampSchema }), read: (f) => ({ stampId: field(f, 'stampId'), input: { reason: field(f, 'reason') } }),
    run: async (context, { stampId, input }) => {
      const { entryId, postId } = await withdrawStamp(context, stampId, input)
      return paths.entry(entryId, postId)
    },
  })
}

export async function askForAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ postId: idText, input: askForSchema }), read: (f) => ({ postId: field(f, 'postId'), input: { what: field(f, 'what') } }),
    run: async (context, { postId, input }) => backTo(form, (await askFor(context, postId, input)).entryId, postId),
  })
}
