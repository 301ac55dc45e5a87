// A line of the closing list, answered for one aeroplane.
import { endpoint, routes } from '@/lib/http/route'
import { pathId } from '@/lib/http/path-id'
import { closingAnswerSchema } from '@/lib/schemas/builds'
import { answerClosingItem } from '@/lib/services/builds/answer-closing-item'

export const { GET, POST, PUT, PATCH, DELETE } = routes({
  PUT: endpoint({
    summary: 'Tick a line of the closing list with a note, or say why it is not done', body: closingAnswerSchema, status: 204,
    handle: async ({ context, params, body }) => {
      await answerClosingItem(context, pathId(params), pathId(params, 'item'), body)
      return {}
    },
  }),
})
