// MiniSearch as it comes: its own words, fields, and order; a slip is met with its usual `fuzzy: 0.2`, a beginning with `prefix`.
import MiniSearch from 'minisearch'
import { hitsWanted, type EngineTask, type Start } from './engine'
import { idOf } from './fill-database'
import { generateTexts } from './generate-texts'

interface Indexed { id: number; title: string; labels: string; body: string; kit: string }

export async function startMiniSearch({ size, seed }: EngineTask): Promise<Start> {
  const begun = performance.now()
  const mini = new MiniSearch<Indexed>({ fields: ['title', 'labels', 'body'], storeFields: ['kit'] })
  for (const t of generateTexts(size, seed)) {
    mini.add({ id: idOf(t.number), title: t.title, labels: [t.kit, t.section, t.operation, ...t.hardware].join(' '), body: `${t.body}\n${t.answer ?? ''}`, kit: t.kit })
  }
  const buildSeconds = (performance.now() - begun) / 1000
  return {
    buildSeconds, startSeconds: 'not tried',
    engine: {
      ask: async ({ text, kit, isPrefix, hasSlip }) => mini.search(text, {
        ...(isPrefix ? { prefix: true } : {}), ...(hasSlip ? { fuzzy: 0.2 } : {}), ...(kit === undefined ? {} : { filter: (result) => result['kit'] === kit }),
      }).slice(0, hitsWanted).map(({ id }) => Number(id)),
      close: async () => undefined,
    },
  }
}
