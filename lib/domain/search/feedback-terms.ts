// What else the entries found first speak of: words that a long question may have meant without saying them (pseudo-relevance feedback).

/** An entry found, with its score and its terms, repetitions and all. */
export interface FoundTerms { score: number; terms: readonly string[] }
export interface FeedbackTerm { term: string; /** 1 for the term that says most, less for others. */ share: number }

/**
 * The `most` terms that the found entries share and others do not: share of the entry's terms × its score × rarity
 * (a relevance model after Lavrenko and Croft 2001, weighed by rarity). Terms of `known` are left out, and terms of one entry only.
 */
export function feedbackTerms(found: readonly FoundTerms[], known: ReadonlySet<string>, rarityOf: (term: string) => number, most: number): FeedbackTerm[] {
  const weights = new Map<string, { weight: number; entries: number }>()
  for (const { score, terms } of found) {
    const counts = new Map<string, number>()
    for (const term of terms) counts.set(term, (counts.get(term) ?? 0) + 1)
    for (const [term, count] of counts) {
      if (known.has(term)) continue
      const { weight, entries } = weights.get(term) ?? { weight: 0, entries: 0 }
      weights.set(term, { weight: weight + (score * count) / terms.length, entries: entries + 1 })
    }
  }
  const ranked = [...weights].filter(([, { entries }]) => entries > 1).map(([term, { weight }]) => ({ term, share: weight * rarityOf(term) }))
    .sort((a, b) => b.share - a.share || (a.term < b.term ? -1 : 1)).slice(0, most)
  const best = ranked[0]?.share ?? 1
  return ranked.map(({ term, share }) => ({ term, share: share / best }))
}
