// What an entry's evidence is worth in the order of results: that of its best answer, or of the lesson itself.

export interface WeighedEntry {
  kind: 'question' | 'lesson'
  /** The entry's own passage first, then those of its visible answers. */
  passages: readonly { weight: number }[]
}

/** A question that nobody has answered helps least. */
const unanswered = 0.95

/** The passage whose evidence counts for the entry. */
export function decidingPassage<P extends { weight: number }>({ kind, passages }: { kind: WeighedEntry['kind']; passages: readonly P[] }): P | undefined {
  const [own, ...answers] = passages
  return kind === 'lesson' ? own : answers.reduce<P | undefined>((best, answer) => (best && best.weight >= answer.weight ? best : answer), undefined) ?? own
}

/** Factor on the text score. A question is as good as its best answer, because that is what its reader will go by. */
export function entryWeight({ kind, passages }: WeighedEntry): number {
  const deciding = decidingPassage({ kind, passages })
  if (!deciding) return 0
  return kind === 'question' && passages.length === 1 ? deciding.weight * unanswered : deciding.weight
}
