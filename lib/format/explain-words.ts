// A search explained, in words and short numbers.
import type { StampState } from '@/lib/domain/stamps/stamp-state'

/** 0.4567 -> "46 %". */
export const percent = (share: number): string => `${Math.round(share * 100)} %`

/** 12.3456 -> "12.3"; small ones keep two figures. */
export const points = (value: number): string => (value >= 10 ? value.toFixed(1) : value.toFixed(2))

/** 1.15 -> "× 1.15". */
export const factor = (value: number): string => `× ${Number(value.toFixed(2))}`

const states: Record<StampState, string> = {
  'none': 'no stamp', 'imported': 'imported stamp', 'one-of-two': '1 of 2 stamps', 'stamped': 'stamped', 'lapsed': 'stamp lapsed', 'plans-changed': 'plans changed',
  'in-question': 'in question', 'withdrawn': 'withdrawn',
}
const kinds = { question: 'Question', lesson: 'Lesson', answer: 'What to do' } as const

export interface EvidenceShown {
  readonly kind: keyof typeof kinds
  readonly stamp: StampState
  readonly critical: boolean
  readonly asWritten: number
  readonly withChange: number
  readonly didNotWork: number
  readonly ofStamp: number
  readonly ofOutcomes: number
}

/** "What to do, stamped (1.15), and how it went: 3 as written, 1 did not work (+ 0.04)". */
export function evidenceWords({ kind, stamp, critical, asWritten, withChange, didNotWork, ofStamp, ofOutcomes }: EvidenceShown): string {
  if (kind === 'question') return 'A question without an answer helps least'
  const told = [[asWritten, 'as written'], [withChange, 'with a change'], [didNotWork, 'did not work']] as const
  const counts = told.filter(([count]) => count > 0).map(([count, words]) => `${count} ${words}`).join(', ')
  const stamped = `${kinds[kind]}, ${states[stamp]} (${ofStamp})`
  if (critical) return `${stamped}; on a critical system how it went never ranks`
  if (counts === '') return `${stamped}; nobody has told how it went`
  return `${stamped}, and how it went: ${counts} (${ofOutcomes < 0 ? '−' : '+'} ${Math.abs(ofOutcomes).toFixed(2)})`
}

/** Why an entry speaks directly to the question; '' when it does not. */
export function directWords({ advises, place }: { readonly advises: boolean; readonly place: 'step' | 'page' | null }): string {
  return [
    ...(advises ? ['its order advice is about these two tasks'] : []),
    ...(place === 'step' ? ['it is about this very step'] : place === 'page' ? ['it is about another step of this page'] : []),
  ].join('; ')
}
