// How directly an entry speaks to what was asked beyond its words: order advice about the pair in question, the very step of the plans.

export interface Direct {
  /** Its order advice, in either direction, is about the two tasks in question. */
  advises: boolean
  /** What it was written about: the step asked for, or another step of that page. */
  place: 'step' | 'page' | null
}

/** More than all evidence can weigh (1.25 / 0.85 = 1.47): of equal texts the one that answers the very question comes first. */
const ofAdvice = 1.5
const ofPlace = { step: 2.25, page: 1.5 }

/** Factor on text score × evidence; 1 for nearly everything. */
export function directness({ advises, place }: Direct): number {
  return (advises ? ofAdvice : 1) * (place === null ? 1 : ofPlace[place])
}
