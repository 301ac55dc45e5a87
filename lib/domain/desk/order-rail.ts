// The mentors' rail: which posts hang on it, why, and in which order. Pure; the facts come from db/queries/desk.ts.
import { SIGNAL_WORDS, type SignalWord } from '../cautions/rule-table'
import type { StampState } from '../stamps/stamp-state'

/** Why a post wants a mentor's look. */
export type RailReason = 'in-question' | 'second' | 'first' | 'lapsed' | 'plans-changed' | 'mentor-gone' | 'open-question'

/** What one post is to one mentor. */
export interface RailFact {
  postId: number
  entryId: number
  kind: 'question' | 'lesson' | 'answer'
  stampState: StampState
  /** On a critical system. */
  needsTwo: boolean
  /** The worst signal word among the cautions that stand on it. */
  worstWord: SignalWord | null
  /** Builders who go by it. */
  goingBy: number
  createdAt: number
  /** A question's visible answers; 0 for others. */
  answers: number
  /** This mentor wrote a revision of it. */
  isOwn: boolean
  /** This mentor's stamp stands on what is there now. */
  isStampedByMe: boolean
  /** Somebody asked its author for something, and waits. */
  isAskedFor: boolean
  /** A kit maker's reply for one serial: nobody stamps it. */
  isForOneSerial: boolean
  /** A stamp that stands on it is a suspended mentor's: it stays, and is looked at again. */
  isByGoneMentor: boolean
}
export interface RailTag<F extends RailFact = RailFact> { fact: F; reason: RailReason }

/** Why it hangs there for this mentor, or null when it does not. */
export function railReason(fact: RailFact): RailReason | null {
  if (fact.isOwn || fact.isAskedFor || fact.isForOneSerial) return null
  if (fact.kind === 'question') return fact.answers === 0 ? 'open-question' : null
  if (fact.stampState === 'in-question') return 'in-question'
  // Every stamp on it is from before a bulletin, this mentor's too.
  if (fact.stampState === 'plans-changed') return 'plans-changed'
  if (fact.isStampedByMe) return null
  switch (fact.stampState) {
    case 'one-of-two': return 'second'
    case 'lapsed': return 'lapsed'
    case 'none':
    case 'imported':
    case 'withdrawn': return 'first'
    case 'stamped': return fact.isByGoneMentor ? 'mentor-gone' : null
  }
}

/**
 * How much it can hurt, 0 (nothing) to 5: a report that stamped advice did not work, a critical system, then by signal word.
 * db/queries/desk.ts cuts very long lists in the same order.
 */
export function harm(fact: Pick<RailFact, 'stampState' | 'needsTwo' | 'worstWord'>): number {
  if (fact.stampState === 'in-question') return 5
  if (fact.needsTwo) return 4
  return fact.worstWord === null ? 0 : SIGNAL_WORDS.length - SIGNAL_WORDS.indexOf(fact.worstWord)
}

/** The tags as they hang: what can hurt first, then what most builders go by, then the oldest. */
export function orderRail<F extends RailFact>(facts: readonly F[]): RailTag<F>[] {
  return facts
    .flatMap((fact): RailTag<F>[] => {
      const reason = railReason(fact)
      return reason ? [{ fact, reason }] : []
    })
    .sort(({ fact: a }, { fact: b }) => harm(b) - harm(a) || b.goingBy - a.goingBy || a.createdAt - b.createdAt || a.postId - b.postId)
}

/** The tag after `postId`, to open next; the first when it hangs last or not at all; null when nothing else hangs. */
export function nextOnRail(tags: readonly RailTag[], postId: number): number | null {
  const at = tags.findIndex((t) => t.fact.postId === postId)
  const next = tags[at + 1] ?? tags[0]
  return next && next.fact.postId !== postId ? next.fact.postId : null
}
