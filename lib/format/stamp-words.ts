// What a stamp says: its condition, the line under it, and the sentence a screen reader gets instead of the drawing.
// The state of a post is computed elsewhere; here it is only put into words.
import type { Basis, ReplyScope, StampState } from '@/lib/domain/stamps/stamp-state'
import { basisLabel, scopeLabel } from './basis'
import { formatFullDate, type Moment } from './date'

export type StampCondition = 'live' | 'lapsed' | 'plans-changed' | 'in-question' | 'withdrawn'

/** The part of a stamp that its face shows. */
export interface StampFace {
  readonly revision: string
  readonly mentor: { readonly mark: string }
  readonly basis: Basis
  readonly reference: string
  readonly plansRevision?: string | null | undefined
  readonly scope?: ReplyScope | null | undefined
  readonly createdAt: Moment
  readonly withdrawn?: { readonly at: Moment, readonly reason: string } | null | undefined
  /** Number of the bulletin that changed its step since. */
  readonly bulletin?: string | undefined
  readonly live: boolean
}

/** Which of its looks a stamp has on a post in `state`: taken back, across which a question stands, no longer binding, or live. */
export function stampCondition(stamp: StampFace, state: StampState): StampCondition {
  if (stamp.withdrawn) return 'withdrawn'
  if (stamp.bulletin !== undefined) return 'plans-changed'
  if (!stamp.live) return state === 'plans-changed' ? 'plans-changed' : 'lapsed'
  if (state === 'plans-changed' || state === 'in-question') return state
  return 'live'
}

const notes: Record<Exclude<StampCondition, 'live'>, string> = {
  lapsed: 'Lapsed: text changed since',
  'plans-changed': 'Plans changed since',
  'in-question': 'In question',
  withdrawn: 'Stamp withdrawn',
}

/** The line at the foot of a stamp that no longer stands as pressed; null when it does. */
export function stampNote(condition: StampCondition, bulletin?: string): string | null {
  if (condition === 'plans-changed' && bulletin !== undefined) return `Plans changed: ${bulletin}`
  return condition === 'live' ? null : notes[condition]
}

function conditionSentence(stamp: StampFace, condition: StampCondition): string {
  switch (condition) {
    case 'live': return ''
    case 'lapsed': return ' Lapsed: the text changed since.'
    case 'plans-changed': return stamp.bulletin === undefined ? ' The plans changed since.' : ` The plans changed since, by bulletin ${stamp.bulletin}.`
    case 'in-question': return ' In question: it did not work for a builder, a mentor has to look again.'
    case 'withdrawn': return stamp.withdrawn ? ` Withdrawn on ${formatFullDate(stamp.withdrawn.at)}: ${stamp.withdrawn.reason}` : ''
  }
}

/** 'Stamp IC 042, published standard AC 43.13-1B para 4-57, 11 March 2026, on revision B. Advice checked, work not inspected.' */
export function stampSentence(stamp: StampFace, condition: StampCondition): string {
  const label = basisLabel(stamp.basis)
  const basis = `${label.charAt(0).toLowerCase()}${label.slice(1)} ${stamp.reference}`.trim() + (stamp.plansRevision ? ` Rev ${stamp.plansRevision}` : '')
  const scope = stamp.scope ? ` (${scopeLabel(stamp.scope)})` : ''
  return `Stamp ${stamp.mentor.mark}, ${basis}${scope}, ${formatFullDate(stamp.createdAt)}, on revision ${stamp.revision}. Advice checked, work not inspected.${conditionSentence(stamp, condition)}`
}
