// Say what to do under a question.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { newAnswerSchema } from '@/lib/schemas/entry-input'
import { answerSchema } from '@/lib/schemas/post'
import { createAnswer } from '@/lib/services/entries/create-answer'
import { getEntry } from '@/lib/services/entries/get-entry'
import { located } from '../../../located'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  POST: endpoint({
    summary: 'Say what to do under a question', body: newAnswerSchema, response: answerSchema, status: 201,
    handle: async ({ context, params, body }) => {
      const questionId = pathId(params)
      const id = await createAnswer(context, questionId, body)
      const { answers } = await getEntry(context, questionId)
      return { body: answers.find((a) => a.id === id), headers: located(questionId, `post-${id}`) }
    },
  }),
})
