// Posts that may already answer what somebody is writing.
import 'server-only'
import type { AppContext } from '@/lib/context'
import type { Hit } from '@/lib/schemas/search'
import { presentHits } from './present-hits'

/** At most six, best first; none for a text too short to tell. */
export async function findSimilar(context: AppContext, input: { title: string; body?: string | undefined; kit?: string | undefined; tasks?: string[] | undefined }): Promise<Hit[]> {
  const text = `${input.title}\n${input.title}\n${input.body ?? ''}`.trim()
  if (text.length < 8) return []
  return presentHits(context, await context.search.similar(text, { kit: input.kit }, 6))
}

/** Other cases for an entry: about the same thing, without itself. Its title says what it is about; its whole text would say too much. */
export async function findOtherCases(context: AppContext, entry: { id: number; title: string; hardware: readonly string[] }): Promise<Hit[]> {
  const hits = await context.search.similar(`${entry.title}\n${entry.hardware.join(' ')}`, {}, 6)
  return presentHits(context, hits.filter((h) => h.id !== entry.id).slice(0, 4))
}
