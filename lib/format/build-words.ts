// Words of a build: the states of its sections, the numbers of its holds, a hold in one sentence.
import type { Hold, SectionState } from '@/lib/schemas/builds'

export const stateWords: Record<SectionState, string> = { 'not-begun': 'Not begun', 'in-work': 'In work', waiting: 'Waiting', done: 'Done' }

/** In the order in which work goes. */
export const sectionStates: readonly SectionState[] = ['not-begun', 'in-work', 'waiting', 'done']

/** 'H-003' for a hold, 'O-004' for what is left open; counted within one build. */
export const holdNumber = (kind: Hold['kind'], ordinal: number): string => `${kind === 'hold' ? 'H' : 'O'}-${String(ordinal).padStart(3, '0')}`

/** 'page W3-2, step 6', or '' when neither is given. */
export const placeWords = ({ page, step }: { page: string; step: string }): string =>
  [page ? `page ${page}` : '', step ? `step ${step}` : ''].filter(Boolean).join(', ')

/** '1 hold', '3 holds'. */
export const countedHolds = (n: number): string => `${n} hold${n === 1 ? '' : 's'}`
