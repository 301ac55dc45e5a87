// A folder of texts, questions and judgments, read into what the index takes. Two shapes: docs.jsonl {id, title, text} with
// queries.jsonl {id, text}, and entries.jsonl (trade entries) with queries.jsonl {id, q, style}; qrels.tsv is question, document, gain.
import { existsSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { z } from 'zod'
import kits from '@/content/demo/kits.json'
import operations from '@/content/operations.json'
import { evidenceWeight } from '@/lib/domain/search/evidence-weight'
import type { SearchDocument } from '@/lib/search/messages'
import type { Gains, Thresholds } from './metrics'

export interface JudgedQuestion { id: string; text: string; style: string; gains: Gains; /** Nothing in the collection answers it. */ absent: boolean }

export interface Collection {
  name: string
  documents: SearchDocument[]
  /** Id in the folder by id in the index. */
  names: ReadonlyMap<number, string>
  questions: JudgedQuestion[]
  thresholds: Thresholds
}

/** File names other than the usual ones: graded judgments, questions with typing errors. */
export interface CollectionFiles { queries?: string | undefined; qrels?: string | undefined }

const docLine = z.object({ id: z.string(), title: z.string(), text: z.string() })
const entryLine = z.object({
  id: z.string(), kind: z.enum(['question', 'lesson']), kit: z.string(), section: z.string(), operations: z.array(z.string()), hardware: z.array(z.string()),
  title: z.string(), body: z.string(), answers: z.array(z.object({ body: z.string(), stamped: z.boolean() })),
})
const queryLine = z.object({ id: z.string(), text: z.string().optional(), q: z.string().optional(), style: z.string().optional() })
type EntryLine = z.infer<typeof entryLine>

/** Reads `folder`; throws when it has neither shape or a line is not what it should be. */
export function readCollection(folder: string, files: CollectionFiles = {}): Collection {
  const file = (name: string) => path.join(folder, name)
  const isTrade = existsSync(file('entries.jsonl'))
  const given = isTrade
    ? readLines(file('entries.jsonl'), entryLine).map((line, i) => ({ name: line.id, document: documentOfEntry(line, i + 1) }))
    : readLines(file('docs.jsonl'), docLine).map((line, i) => ({ name: line.id, document: documentOfText(line, i + 1) }))
  const gains = readGains(file(files.qrels ?? 'qrels.tsv'))
  return {
    name: [path.basename(path.resolve(folder)), files.qrels, files.queries].filter((part) => part !== undefined).join(' '),
    documents: given.map(({ document }) => document),
    names: new Map(given.map(({ name, document }) => [document.id, name])),
    questions: readLines(file(files.queries ?? 'queries.jsonl'), queryLine).map(({ id, text, q, style }) => {
      const own = gains.get(id) ?? new Map<string, number>()
      return { id, text: q ?? text ?? '', style: style ?? 'all', gains: own, absent: style === 'absent' }
    }),
    // A trade entry with gain 1 is only on the topic: whoever asked is not answered by it.
    thresholds: { relevant: 1, success: isTrade ? 2 : 1 },
  }
}

function readLines<T>(file: string, shape: z.ZodType<T>): T[] {
  return readFileSync(file, 'utf8').split('\n').filter((line) => line.trim() !== '').map((line) => shape.parse(JSON.parse(line)))
}

function readGains(file: string): Map<string, Map<string, number>> {
  const gains = new Map<string, Map<string, number>>()
  for (const line of readFileSync(file, 'utf8').split('\n')) {
    const [question, document, gain] = line.trim().split('\t')
    if (!question || !document || gain === undefined) continue
    const own = gains.get(question) ?? new Map<string, number>()
    gains.set(question, own.set(document, Number(gain)))
  }
  return gains
}

/** An abstract is a lesson without a place: nothing but its words ranks it. */
function documentOfText({ title, text }: z.infer<typeof docLine>, id: number): SearchDocument {
  return {
    id, kind: 'lesson', kit: '', sections: [], operations: [], tasks: [], stamped: false, open: false, createdAt: id, title, labels: '',
    passages: [{ postId: id, text, weight: 1 }],
  }
}

/**
 * An entry as importing it and lib/search/build-document.ts make it: kit, section and operations as labels with their titles where
 * the house knows them, hardware as written; every answer a passage; a stamp from elsewhere counts as imported, a question itself for 1.
 * Texts are taken as typed: their Markdown is plain.
 */
function documentOfEntry(entry: EntryLine, id: number): SearchDocument {
  const kit = kits.find(({ name }) => name === entry.kit)
  const section = kit?.sections.find(({ code }) => code === entry.section)
  const answers = entry.answers.map(({ body, stamped }, i) => ({ postId: id * 1_000 + i + 1, text: body, weight: weightOf(stamped) }))
  const titles = entry.operations.map((slug) => operations.find((operation) => operation.slug === slug)?.title ?? slug.replaceAll('-', ' '))
  return {
    id, kind: entry.kind, kit: kit?.slug ?? entry.kit, sections: [entry.section], operations: entry.operations, tasks: [],
    // Imported stamps are none of the house's own.
    stamped: false, open: entry.kind === 'question' && answers.length === 0, createdAt: id, title: entry.title,
    labels: [entry.kit, entry.section, section?.title ?? '', ...titles, ...entry.hardware].filter((label) => label !== '').join('\n'),
    passages: [{ postId: id, text: entry.body, weight: entry.kind === 'question' ? 1 : weightOf(false) }, ...answers],
  }
}

const weightOf = (stamped: boolean): number => evidenceWeight({ stampState: stamped ? 'imported' : 'none', critical: false, asWritten: 0, withChange: 0, didNotWork: 0 })
