// What completes the words being typed: what a shop table works out of them, entries with their cautions, sections, operations, tables.
import 'server-only'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { listOperations, listSections } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { leadResults } from '@/lib/domain/shop/lead-results'
import { readShopQuery, type ShopReading } from '@/lib/domain/shop/read-query'
import { SHOP_TABLES, shopTable } from '@/lib/domain/shop/shop-tables'
import { basisWords } from '@/lib/format/shop-words'
import { paths } from '@/lib/paths'
import type { Caution } from '@/lib/schemas/post'
import type { Suggestion } from '@/lib/schemas/search'
import { presentCautions } from '@/lib/services/posts/present-post'
import { answerTable } from '@/lib/services/shop/answer-table'
import { shopCautions } from '@/lib/services/shop/shop-cautions'

const most = 8

/** Up to eight. Empty words give none. */
export async function suggest(context: AppContext, text: string): Promise<Suggestion[]> {
  const words = text.trim().toLowerCase()
  if (words === '') return []
  const [found, sections, operations] = await Promise.all([context.search.suggest(text, 6), listSections(context.reader), listOperations(context.reader)])
  const posts = await listCautionedPosts(context.reader, found.map((f) => f.id), 'plain')
  const entries = posts.filter((p) => p.state === 'visible' && p.kind !== 'answer').map((p): Suggestion => ({
    text: p.current.title, kind: p.kind === 'lesson' ? 'lesson' : 'question', id: p.id, url: paths.entry(p.id),
    cautions: briefly(presentCautions(p).filter((c) => !c.waived)),
  }))
  const begins = (value: string) => value.toLowerCase().startsWith(words) || value.toLowerCase().includes(` ${words}`)
  const places = sections.filter((s) => begins(s.code) || begins(s.title)).slice(0, 3)
    .map((s): Suggestion => ({ text: `${s.code} ${s.title}`, kind: 'section', url: paths.section(s.kit, s.code), cautions: [] }))
  const acts = operations.filter((o) => begins(o.title)).slice(0, 2)
    .map((o): Suggestion => ({ text: o.title, kind: 'operation', url: paths.search({ operation: o.slug }), cautions: [] }))
  const worked = readShopQuery(text).slice(0, 3).flatMap((reading) => workedOut(reading) ?? [])
  const tables = worked.length > 0 ? [] : SHOP_TABLES.filter((t) => begins(t.title) || begins(t.slug)).slice(0, 2)
    .map((t): Suggestion => ({ text: t.title, kind: 'shop', url: paths.shopTable(t.slug), cautions: briefly(shopCautions(t)) }))
  const beside = [...places, ...acts, ...tables]
  return [...worked, ...entries.slice(0, Math.max(most - worked.length - beside.length, 0)), ...beside].slice(0, most)
}

const briefly = (cautions: readonly Pick<Caution, 'signalWord' | 'topic'>[]): Suggestion['cautions'] => cautions.map(({ signalWord, topic }) => ({ signalWord, topic }))

/** A table's answer in one line, "5/8 in: a grommet with a 3/8 bore"; a number that was not seen in its source says so. Null where it has none. */
function workedOut({ table: slug, inputs, label }: ShopReading): Suggestion | null {
  const table = shopTable(slug)
  const answered = table ? answerTable(table, inputs) : null
  if (!table || !answered?.ok) return null
  const [lead] = leadResults(slug, answered.answer.results)
  if (!lead || Object.keys(lead.value).length === 0) return { text: label, kind: 'shop', url: paths.shopTable(slug, inputs), cautions: briefly(answered.answer.cautions) }
  const { text, isLoud } = basisWords(lead)
  return { text: `${lead.display.inch}: ${label}${isLoud ? ` (${text})` : ''}`, kind: 'shop', url: paths.shopTable(slug, inputs), cautions: briefly(answered.answer.cautions) }
}
