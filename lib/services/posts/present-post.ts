// CautionedPost -> the Post of the API and of the pages. The only place that maps one to the other.
import 'server-only'
import type { CautionedPost } from '@/db/queries/cautioned-post'
import { cautionTable } from '@/lib/content/caution-table'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { requiredCautions } from '@/lib/domain/cautions/required-cautions'
import { textFields } from '@/lib/domain/entries/entry-text'
import { revisionLetter } from '@/lib/domain/entries/revision-letter'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { parserVersion } from '@/lib/domain/measurements/measurement'
import { changeUnknownTo, isLive, plansChanges } from '@/lib/domain/stamps/stamp-state'
import type { PlansChange } from '@/lib/domain/stamps/plans-change'
import { paths } from '@/lib/paths'
import type { Measurement } from '@/lib/schemas/measurement'
import type { Answer, Caution, Entry, Outcomes, PlanChange, Post, Remark, Stamp } from '@/lib/schemas/post'
import { judge } from './judge-post'

const definitions = new Map(cautionTable.cautions.map((c) => [c.code, c]))
const iso = (ms: number) => new Date(ms).toISOString()
const person = (p: { id: number | null; name: string }) => (p.id === null ? { name: p.name } : { id: p.id, name: p.name })

/** A post's cautions with their words, worst first; waived ones say so and stay readable. */
export function presentCautions(found: CautionedPost): Caution[] {
  const list = found.cautions.flatMap((row): Caution[] => {
    const words = definitions.get(row.code)
    // A code that a newer table dropped still warns, with what the row says.
    const definition = words ?? { code: row.code, signalWord: 'WARNING' as const, topic: 'structure' as const, title: row.code, text: row.because, short: row.because, twoStamps: true }
    return [{ ...pick(definition), because: row.because, origin: row.origin, ...(row.waivedAt !== null ? { waived: { at: iso(row.waivedAt), reason: row.waivedReason ?? '' } } : {}) }]
  })
  return unionCautions([list])
}

const pick = (c: { code: string; signalWord: Caution['signalWord']; topic: Caution['topic']; title: string; text: string; short: string; twoStamps: boolean }) =>
  ({ code: c.code, signalWord: c.signalWord, topic: c.topic, title: c.title, text: c.text, short: c.short, twoStamps: c.twoStamps })

/** What the rules ask of a remark's own words, beside its post's. */
export function cautionsOfWords(text: string): Caution[] {
  return requiredCautions(cautionTable, { text, operations: [], tasks: [], hardware: [], jasc: [] }).map((c) => ({ ...pick(c), because: c.because, origin: 'rule' as const }))
}

/** A place where the plans changed since, as it is told to readers. */
export const presentChanges = (changes: readonly PlansChange[]): PlanChange[] =>
  changes.map((c) => ({ bulletin: c.bulletin, page: c.page, ...(c.step !== null ? { step: c.step } : {}), ...(c.revision !== '' ? { revision: c.revision } : {}) }))

export function presentStamps(found: CautionedPost, questionRevision: number): Stamp[] {
  const now = { currentRevision: found.current.number, questionRevision }
  const changes = plansChanges({ ...now, plans: found.plans, bulletins: found.bulletins, stamps: found.stamps })
  return found.stamps.flatMap((s): Stamp[] => {
    if (s.mentorId === null || s.basis === 'imported') return []
    const change = isLive(s, now) ? changeUnknownTo(s, changes) : null
    return [{
      id: s.id, revision: revisionLetter(s.revision), mentor: { id: s.mentorId, mark: s.mark }, basis: s.basis, reference: s.reference,
      ...(s.plansRevision !== null ? { plansRevision: s.plansRevision } : {}), ...(s.scope !== null ? { scope: s.scope } : {}),
      ...(s.conflictReason !== null ? { conflictReason: s.conflictReason } : {}), createdAt: iso(s.createdAt),
      ...(s.withdrawnAt !== null ? { withdrawn: { at: iso(s.withdrawnAt), reason: s.withdrawnReason ?? '' } } : {}),
      ...(change ? { bulletin: change.bulletin } : {}), live: isLive(s, now) && change === null,
    }]
  })
}

/** Counts speak of the current revision; the items name the revision they were told of. */
export function presentOutcomes(found: CautionedPost): Outcomes {
  const now = found.outcomes.filter((o) => o.revision === found.current.number)
  const of = (result: string) => now.filter((o) => o.result === result).length
  return {
    asWritten: of('as-written'), withChange: of('with-change'), didNotWork: of('did-not-work'),
    items: found.outcomes.map((o) => ({ author: { id: o.memberId, name: o.author }, revision: revisionLetter(o.revision), result: o.result, note: o.note, createdAt: iso(o.createdAt) })),
  }
}

/** HTML of the whole post: its parts under their labels. The fields were sanitised when they were rendered. */
export function wholeHtml(found: CautionedPost): string {
  const { current, rendering } = found
  return textFields(found.kind, current.parts, current.body)
    .map((f) => `${f.label ? `<h3>${f.label}</h3>` : ''}${rendering?.html[f.name] ?? ''}`).join('\n')
}

function presentRemarks(found: CautionedPost, rendered: ReadonlyMap<number, { html: string; plain: string }>): Remark[] {
  return found.remarks.map((r) => ({
    id: r.id, author: person(r.author), html: rendered.get(r.id)?.html ?? '', text: rendered.get(r.id)?.plain ?? r.body, createdAt: iso(r.createdAt),
    cautions: unionCautions([presentCautions(found), cautionsOfWords(r.body)]),
  }))
}

export type RemarkRenderings = ReadonlyMap<number, { html: string; plain: string }>

/** The stored ones; found anew where an older parser stored them. Places are those of the plain text. */
const measurementsOf = (found: CautionedPost): Measurement[] =>
  (found.measuredBy >= parserVersion ? found.measurements : findMeasurements(found.plain ?? ''))

/** The fields that questions, lessons and answers share. */
export function presentPost(found: CautionedPost, questionRevision: number, remarks: RemarkRenderings): Post {
  const { state, missing, changes } = judge(found, questionRevision)
  return {
    id: found.id, kind: found.kind, ...(found.parentId !== null ? { parentId: found.parentId } : {}), ...(found.ref !== null ? { ref: found.ref } : {}),
    revision: revisionLetter(found.current.number), author: person(found.author), createdAt: iso(found.createdAt), updatedAt: iso(found.updatedAt),
    html: wholeHtml(found), text: found.plain ?? '', measurements: measurementsOf(found),
    cautions: presentCautions(found), planChanges: presentChanges(changes), stamp: state, missing, stamps: presentStamps(found, questionRevision), needsTwo: found.needsTwo,
    outcomes: presentOutcomes(found), goingByThis: found.goingByThis, remarks: presentRemarks(found, remarks),
    revisions: found.revisions.map((r) => ({ revision: revisionLetter(r.number), author: person(r.author), createdAt: iso(r.createdAt) })),
    state: found.state,
  }
}

export function presentAnswer(found: CautionedPost, question: CautionedPost, remarks: RemarkRenderings): Answer {
  const base = presentPost(found, question.current.number, remarks)
  return { ...base, kind: 'answer', parentId: question.id, ...(found.current.makerReplyScope !== null ? { makerReply: found.current.makerReplyScope } : {}) }
}

export function presentEntry(found: CautionedPost, answers: readonly Answer[], remarks: RemarkRenderings): Entry {
  const { current } = found
  if (found.kind === 'answer') throw new Error('An answer is not an entry')
  return {
    ...presentPost(found, 0, remarks), kind: found.kind, title: current.title, kit: found.kit?.slug ?? '', sections: current.sections, tasks: current.tasks,
    operations: current.operations, hardware: current.hardware, plans: current.plans.map((p) => ({ page: p.page, ...(p.step ? { step: p.step } : {}), ...(p.revision ? { revision: p.revision } : {}) })),
    parts: current.parts, body: current.body, orderAdvice: current.orderAdvice, answers: [...answers], url: paths.entry(found.id),
  }
}
