// How it went, in words: counts with their result, never an average. On critical systems "as written" says only that it went together.

export type OutcomeResult = 'as-written' | 'with-change' | 'did-not-work'

/** One result's share of the line: "5 went together as written", "1 with a change: every hole clecoed". */
export interface OutcomePhrase {
  readonly count: number
  readonly words: string
}

export interface OutcomeCounts {
  readonly asWritten: number
  readonly withChange: number
  readonly didNotWork: number
  readonly items: readonly { readonly result: OutcomeResult, readonly note: string }[]
}

/** The non-empty results in fixed order. With `notes`, a result told once carries its builder's own words. */
export function outcomePhrases(outcomes: OutcomeCounts, critical: boolean, notes: boolean): OutcomePhrase[] {
  const note = (result: OutcomeResult, count: number): string => {
    const words = notes && count === 1 ? outcomes.items.find((item) => item.result === result)?.note.trim() : undefined
    return words ? `: ${words}` : ''
  }
  const phrases = [
    { count: outcomes.asWritten, words: critical ? 'went together as written' : 'as written' },
    { count: outcomes.withChange, words: `with a change${note('with-change', outcomes.withChange)}` },
    { count: outcomes.didNotWork, words: `did not work${note('did-not-work', outcomes.didNotWork)}` },
  ]
  return phrases.filter((phrase) => phrase.count > 0)
}
