// What the rules would require of a text: shown while writing, before anything is stored.
import 'server-only'
import { getKit, listTasksBySlug } from '@/db/queries/kits'
import { getCautionedPost } from '@/db/queries/cautioned-post'
import type { AppContext } from '@/lib/context'
import { cautionTable } from '@/lib/content/caution-table'
import { requiredCautions } from '@/lib/domain/cautions/required-cautions'
import { can } from '@/lib/policy/can'
import type { Caution } from '@/lib/schemas/post'
import { cautionsOfAnswer } from '@/lib/services/posts/attach-cautions'
import { subjectOf } from '@/lib/services/posts/load-entry'

interface Input { title?: string | undefined; body: string; tasks?: string[] | undefined; operations?: string[] | undefined; hardware?: string[] | undefined; kit?: string | undefined; sections?: string[] | undefined; question?: number | undefined }

/** Unknown names count for nothing here: the publish itself refuses them. */
export async function listRequiredCautions(context: AppContext, input: Input): Promise<{ cautions: Caution[] }> {
  if (input.question !== undefined) return listRequiredAnswerCautions(context, input.question, input.body)
  const kit = input.kit === undefined ? null : await getKit(context.reader, input.kit)
  const tasks = await listTasksBySlug(context.reader, input.tasks ?? [])
  const required = requiredCautions(cautionTable, {
    ...(input.title !== undefined ? { title: input.title } : {}), text: input.body, tasks: tasks.map((t) => t.slug),
    operations: [...new Set([...(input.operations ?? []), ...tasks.map((t) => t.operation)])], hardware: input.hardware ?? [],
    jasc: (input.sections ?? []).flatMap((code) => kit?.sections.find((s) => s.code === code)?.jasc ?? []),
  })
  return { cautions: required.map((c) => ({ ...c, origin: 'rule' as const })) }
}

/** The same for what to do under a question: it takes its question's. */
export async function listRequiredAnswerCautions(context: AppContext, questionId: number, body: string): Promise<{ cautions: Caution[] }> {
  const question = await getCautionedPost(context.reader, questionId)
  if (!question || question.kind !== 'question' || !can(context.actor, 'post.read', subjectOf(question))) return { cautions: [] }
  return { cautions: cautionsOfAnswer(question, body).map((c) => ({ ...c, origin: 'rule' as const })) }
}
