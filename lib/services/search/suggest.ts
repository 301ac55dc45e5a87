// What completes the words being typed: entries with their cautions, sections and operations.
import 'server-only'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { listOperations, listSections } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { paths } from '@/lib/paths'
import type { Suggestion } from '@/lib/schemas/search'
import { presentCautions } from '@/lib/services/posts/present-post'

const most = 8

/** Up to eight. Empty words give none. */
export async function suggest(context: AppContext, text: string): Promise<Suggestion[]> {
  const words = text.trim().toLowerCase()
  if (words === '') return []
  const [found, sections, operations] = await Promise.all([context.search.suggest(text, 6), listSections(context.reader), listOperations(context.reader)])
  const posts = await listCautionedPosts(context.reader, found.map((f) => f.id), 'plain')
  const entries = posts.filter((p) => p.state === 'visible' && p.kind !== 'answer').map((p): Suggestion => ({
    text: p.current.title, kind: p.kind === 'lesson' ? 'lesson' : 'question', id: p.id, url: paths.entry(p.id),
    cautions: presentCautions(p).filter((c) => !c.waived).map((c) => ({ signalWord: c.signalWord, topic: c.topic })),
  }))
  const begins = (value: string) => value.toLowerCase().startsWith(words) || value.toLowerCase().includes(` ${words}`)
  const places = sections.filter((s) => begins(s.code) || begins(s.title)).slice(0, 3)
    .map((s): Suggestion => ({ text: `${s.code} ${s.title}`, kind: 'section', url: paths.section(s.kit, s.code), cautions: [] }))
  const acts = operations.filter((o) => begins(o.title)).slice(0, 2)
    .map((o): Suggestion => ({ text: o.title, kind: 'operation', url: paths.search({ operation: o.slug }), cautions: [] }))
  return [...entries.slice(0, most - places.length - acts.length), ...places, ...acts].slice(0, most)
}
