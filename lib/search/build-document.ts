// From an entry and its answers, as the database gives them with their cautions, to what the index holds.
import 'server-only'
import type { CautionedPost } from '@/db/queries/cautioned-post'
import { evidenceWeight, type EvidenceFact } from '@/lib/domain/search/evidence-weight'
import type { TaskName } from '@/lib/domain/search/task-names'
import type { OrderAdvice, SearchDocument } from './messages'

/** Counts up when the same rows give another document than before (here, in evidence-weight.ts or in the plain text): snapshots made of older ones are not used. */
export const documentVersion = 1

/** Titles by slug: what people type instead of a slug. Sections bring their titles along. */
export interface SearchTitles {
  tasks: ReadonlyMap<string, string>
  operations: ReadonlyMap<string, string>
  /** Title of the operation a task belongs to. */
  operationOfTask: ReadonlyMap<string, string>
}

/**
 * The document of `entry`, or null when it must not be found: not visible, or its own text was withdrawn.
 * Answers that are not visible are left out, and so are withdrawn ones.
 */
export function buildDocument(entry: CautionedPost, answers: readonly CautionedPost[], titles: SearchTitles): SearchDocument | null {
  if (entry.kind === 'answer' || entry.state !== 'visible') return null
  const standing = answers.filter((answer) => answer.state === 'visible')
  const passages = [entry, ...standing].map(passageOf).filter(({ weight }) => weight > 0)
  if (passages[0]?.postId !== entry.id) return null
  const { kit, current } = entry
  const orderAdvice = [entry, ...standing].filter(({ id }) => passages.some(({ postId }) => postId === id)).flatMap((post) => adviceOf(post, titles))
  return {
    id: entry.id, kind: entry.kind, kit: kit?.slug ?? '', sections: current.sections, operations: current.operations, tasks: current.tasks,
    stamped: (entry.kind === 'lesson' ? [entry] : standing).some((post) => post.stampState === 'stamped'),
    open: entry.kind === 'question' && standing.length === 0,
    createdAt: entry.createdAt, title: current.title, labels: labelsOf(entry, orderAdvice, titles), passages, orderAdvice,
  }
}

function passageOf(post: CautionedPost): SearchDocument['passages'][number] {
  return { postId: post.id, text: plainText(post), weight: post.kind === 'question' ? 1 : evidenceWeight(evidenceFactOf(post)) }
}

/** What is known of a post's evidence: stamp state and outcomes told of the current revision. */
export function evidenceFactOf(post: CautionedPost): EvidenceFact {
  const told = (result: CautionedPost['outcomes'][number]['result']) =>
    post.outcomes.filter((o) => o.revision === post.current.number && o.result === result).length
  return {
    stampState: post.stampState, critical: post.needsTwo,
    asWritten: told('as-written'), withChange: told('with-change'), didNotWork: told('did-not-work'),
  }
}

function adviceOf({ id, current }: CautionedPost, titles: SearchTitles): OrderAdvice[] {
  const name = (slug: string): TaskName => ({ slug, title: titles.tasks.get(slug) ?? slug.replaceAll('-', ' '), operation: titles.operationOfTask.get(slug) ?? '' })
  return current.orderAdvice.map(({ before, after }) => ({ postId: id, before: name(before), after: name(after) }))
}

/** The rendered text when it is at hand, else the Markdown as typed: it finds the same words. */
function plainText({ plain, current }: CautionedPost): string {
  if (plain !== null) return plain
  const parts = Object.values(current.parts ?? {}).filter((part) => typeof part === 'string')
  return [...parts, current.body].filter((text) => text !== '').join('\n')
}

function labelsOf({ kit, sections, current }: CautionedPost, advice: readonly OrderAdvice[], titles: SearchTitles): string {
  const titled = (slugs: readonly string[], known: ReadonlyMap<string, string>) => slugs.map((slug) => known.get(slug) ?? slug.replaceAll('-', ' '))
  return [
    kit?.name ?? '',
    ...sections.flatMap(({ code, title }) => [code, title]),
    ...titled(current.operations, titles.operations), ...titled(current.tasks, titles.tasks),
    ...current.hardware,
    ...current.plans.map(({ page, step }) => (step ? `${page} step ${step}` : page)),
    ...advice.map(({ before, after }) => `${before.title} before ${after.title}`),
  ].filter((label) => label !== '').join('\n')
}
