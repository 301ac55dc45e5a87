// A new revision of an answer, by its author.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { answerEditSchema } from '@/lib/schemas/entry-input'
import { answerSchema } from '@/lib/schemas/post'
import { editAnswer } from '@/lib/services/entries/edit-answer'
import { getEntry } from '@/lib/services/entries/get-entry'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  PATCH: endpoint({
    summary: 'A new revision of an answer, by its author', body: answerEditSchema, response: answerSchema,
    handle: async ({ context, params, body }) => {
      const id = pathId(params)
      const { questionId } = await editAnswer(context, id, body)
      const { answers } = await getEntry(context, questionId)
      return { body: answers.find((a) => a.id === id) }
    },
  }),
})
