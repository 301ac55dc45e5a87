// The state of a post's stamps, derived from what is stored: never a judgement of its own.
import { findPlansChanges, type BulletinFact, type PlansChange, type PlansPlace } from './plans-change'

export const stampStates = ['none', 'imported', 'one-of-two', 'stamped', 'lapsed', 'plans-changed', 'in-question', 'withdrawn'] as const
export type StampState = (typeof stampStates)[number]
export const bases = ['plans', 'standard', 'own-build', 'maker-reply'] as const
export type Basis = (typeof bases)[number]
export const replyScopes = ['bulletin', 'all-kits', 'one-serial'] as const
export type ReplyScope = (typeof replyScopes)[number]

export interface StampFact {
  revision: number
  /** The question's revision that was read; 0 on a lesson. */
  questionRevision: number
  /** Null for an imported stamp. */
  mentorId: number | null
  basis: Basis | 'imported'
  scope: ReplyScope | null
  /** What it stands on; of a plans stamp, the page and step that were before the mentor. */
  reference: string
  createdAt: number
  withdrawnAt: number | null
  /** Of a plans stamp: the revision of the page that was before the mentor. */
  plansRevision?: string | null
}

export interface StampSubject {
  currentRevision: number
  /** Current revision of the question an answer belongs to; 0 on a lesson. */
  questionRevision: number
  needsTwo: boolean
  postState: 'visible' | 'hidden' | 'merged' | 'withdrawn'
  /** Everybody who wrote a revision: their stamps would not count. */
  authorIds: readonly number[]
  stamps: readonly StampFact[]
  /** Times of "did not work" reports on the current revision. */
  failuresAt: readonly number[]
  /** When the current revision was written. */
  revisedAt: number
  /** Plans pages and steps that it is about; an answer's are its question's. */
  plans: readonly PlansPlace[]
  /** Bulletins of its kit, and of no other. */
  bulletins: readonly BulletinFact[]
}

export interface Judgement {
  state: StampState
  missing: Missing
  /** Places where the plans changed after it was written and after the last stamp that stands: what a reader has to be told. Newest first. */
  changes: PlansChange[]
}

/** What still lacks before the post is stamped. */
export type Missing = 'first' | 'second' | 'firm-basis' | null

/** A basis that stands on paper: a plans step, a published standard, or a maker's reply of general scope. */
export function isFirm(stamp: Pick<StampFact, 'basis' | 'scope'>): boolean {
  return stamp.basis === 'plans' || stamp.basis === 'standard' || (stamp.basis === 'maker-reply' && stamp.scope !== 'one-serial')
}

/** True while a stamp stands on what is there now: this revision, this revision of the question, not withdrawn. */
export function isLive(stamp: StampFact, subject: Pick<StampSubject, 'currentRevision' | 'questionRevision'>): boolean {
  return stamp.withdrawnAt === null && stamp.revision === subject.currentRevision && stamp.questionRevision === subject.questionRevision
}

/** Every bulletin that concerns the post: by its own plans references, or by those of the plans stamps that stand on it. */
export function plansChanges(subject: Pick<StampSubject, 'plans' | 'bulletins' | 'stamps' | 'currentRevision' | 'questionRevision'>): PlansChange[] {
  return findPlansChanges(subject.bulletins, subject.plans, subject.stamps.filter((s) => s.basis === 'plans' && isLive(s, subject)).map((s) => s.reference))
}

/** The newest bulletin that came after a stamp was pressed (or with it), or null while the stamp still knows the plans. */
export function changeSince(pressedAt: number, changes: readonly PlansChange[]): PlansChange | null {
  return changes.find((c) => c.enteredAt >= pressedAt) ?? null
}

/** The newest bulletin that a stamp does not know: entered after it, or on a later revision of the page than the one it names. */
export function changeUnknownTo(stamp: Pick<StampFact, 'createdAt' | 'basis' | 'plansRevision'>, changes: readonly PlansChange[]): PlansChange | null {
  return changes.find((c) => !knows(stamp, c)) ?? null
}

function knows({ createdAt, basis, plansRevision }: Pick<StampFact, 'createdAt' | 'basis' | 'plansRevision'>, change: PlansChange): boolean {
  return change.enteredAt < createdAt && !(basis === 'plans' && isEarlier(plansRevision ?? '', change.revision))
}

/** Letters only: other ways of naming a revision have no order that can be told. */
function isEarlier(named: string, current: string): boolean {
  const [a, b] = [named.trim().toUpperCase(), current.trim().toUpperCase()]
  return /^[A-Z]{1,2}$/.test(a) && /^[A-Z]{1,2}$/.test(b) && (a.length < b.length || (a.length === b.length && a < b))
}

/** State and what is missing, for one post. Total and deterministic; the order of the facts does not matter. */
export function judgeStamps(subject: StampSubject): Judgement {
  const concerning = plansChanges(subject)
  const standing = subject.stamps.filter((s) => s.withdrawnAt === null)
  const live = standing.filter((s) => isLive(s, subject) && s.mentorId !== null && !subject.authorIds.includes(s.mentorId))
  // A stamp from before a bulletin says nothing about the step as it is now.
  const fresh = live.filter((s) => changeUnknownTo(s, concerning) === null)
  const missing = missingStamp(fresh, subject.needsTwo)
  const changes = concerning.filter((c) => c.enteredAt >= subject.revisedAt && !live.some((s) => knows(s, c)))
  if (subject.postState === 'withdrawn') return { state: 'withdrawn', missing, changes }
  if (live.length === 0) return { state: stateWithoutLive(subject, standing, concerning), missing, changes }
  // Only critical systems need two stamps, and only there does one report put a stamp in question.
  if (subject.needsTwo && subject.failuresAt.some((at) => at > Math.max(...live.map((s) => s.createdAt)))) return { state: 'in-question', missing, changes }
  if (fresh.length === 0) return { state: 'plans-changed', missing, changes }
  return { state: missing === null ? 'stamped' : 'one-of-two', missing, changes }
}

function stateWithoutLive(subject: StampSubject, standing: readonly StampFact[], concerning: readonly PlansChange[]): StampState {
  const imported = standing.filter((s) => s.mentorId === null && isLive(s, subject))
  if (imported.some((s) => changeSince(s.createdAt, concerning) === null)) return 'imported'
  if (imported.length > 0) return 'plans-changed'
  if (standing.length > 0) return 'lapsed'
  const withdrawnHere = subject.stamps.some((s) => s.withdrawnAt !== null && s.revision === subject.currentRevision)
  return withdrawnHere ? 'withdrawn' : 'none'
}

function missingStamp(live: readonly StampFact[], needsTwo: boolean): Missing {
  const mentors = new Set(live.map((s) => s.mentorId))
  if (mentors.size === 0) return 'first'
  if (!needsTwo) return null
  if (mentors.size === 1) return 'second'
  return live.some(isFirm) ? null : 'firm-basis'
}
