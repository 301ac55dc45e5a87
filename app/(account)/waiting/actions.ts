'use server'
// Closes what waited for the member who asks.
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { idText } from '@/lib/schemas/text'
import { closeNotice } from '@/lib/services/notices/close-notice'

export async function closeNoticeAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ noticeId: idText }), read: (f) => ({ noticeId: field(f, 'noticeId') }),
    run: async (context, { noticeId }) => {
      await closeNotice(context, noticeId)
      return paths.waiting
    },
  })
}
