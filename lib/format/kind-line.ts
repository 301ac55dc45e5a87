// The line over a search hit's title: what the passage is, who wrote it, which revision. The style sets it in capitals.
import type { StampState } from '@/lib/domain/stamps/stamp-state'

/** The part of a hit that its line is made from. */
export interface HitKind {
  readonly open: boolean
  readonly answers: number
  readonly stamp: StampState
  readonly passage: { readonly kind: 'question' | 'lesson' | 'answer', readonly author: { readonly name: string }, readonly revision: string }
}

const stampWords: Partial<Record<StampState, string>> = {
  'one-of-two': '1 of 2 stamps',
  lapsed: 'stamp lapsed',
  'plans-changed': 'plans changed',
  'in-question': 'in question',
  imported: 'imported stamp',
}

const kinds = { question: 'Question', lesson: 'Lesson', answer: 'What to do' } as const

/** 'Lesson · Dela Whitcombe · Rev B'; 'Question · Marit Osei · 1 row, stamp lapsed'; 'Open question · Marit Osei'. */
export function hitKindLine({ open, answers, stamp, passage }: HitKind): string {
  const kind = open && passage.kind === 'question' ? 'Open question' : kinds[passage.kind]
  const words = stampWords[stamp]
  if (passage.kind !== 'question') return [kind, passage.author.name, `Rev ${passage.revision}`, ...(words ? [words] : [])].join(' · ')
  const rows = answers === 0 ? '' : `${answers} ${answers === 1 ? 'row' : 'rows'}`
  return [kind, passage.author.name, [rows, words].filter(Boolean).join(', ')].filter(Boolean).join(' · ')
}
