// What an entry's evidence is worth in the order of results: that of its best answer, or of the lesson itself.

export interface WeighedEntry {
  kind: 'question' | 'lesson'
  /** The entry's own passage first, then those of its visible answers. */
  passages: readonly { weight: number }[]
}

/** A question that nobody has answered helps least. */
const unanswered = 0.95

/** Factor on the text score. A question is as good as its best answer, because that is what its reader will go by. */
export function entryWeight({ kind, passages }: WeighedEntry): number {
  const [own, ...answers] = passages
  if (!own) return 0
  if (kind === 'lesson') return own.weight
  return answers.length === 0 ? own.weight * unanswered : Math.max(...answers.map((answer) => answer.weight))
}
