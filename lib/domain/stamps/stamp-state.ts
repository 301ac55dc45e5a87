// The state of a post's stamps, derived from what is stored: never a judgement of its own.

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
  createdAt: number
  withdrawnAt: number | null
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

/** State and what is missing, for one post. Total and deterministic; the order of the stamps does not matter. */
export function judgeStamps(subject: StampSubject): { state: StampState; missing: Missing } {
  const standing = subject.stamps.filter((s) => s.withdrawnAt === null)
  const live = standing.filter((s) => isLive(s, subject) && s.mentorId !== null && !subject.authorIds.includes(s.mentorId))
  const missing = missingStamp(live, subject.needsTwo)
  if (subject.postState === 'withdrawn') return { state: 'withdrawn', missing }
  if (live.length === 0) return { state: stateWithoutLive(subject, standing), missing }
  const lastLookAt = Math.max(...live.map((s) => s.createdAt))
  // Only critical systems need two stamps, and only there does one report put a stamp in question.
  if (subject.needsTwo && subject.failuresAt.some((at) => at > lastLookAt)) return { state: 'in-question', missing }
  return { state: missing === null ? 'stamped' : 'one-of-two', missing }
}

function stateWithoutLive(subject: StampSubject, standing: readonly StampFact[]): StampState {
  if (standing.some((s) => s.mentorId === null && isLive(s, subject))) return 'imported'
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
