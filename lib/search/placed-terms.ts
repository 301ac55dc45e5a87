// Which terms stand where in a text: what marks a hit. Kept for the texts read last, because the same entries are found again and again.
import 'server-only'
import { analyseText } from '@/lib/domain/search/analyse-text'
import { findValues } from '@/lib/domain/search/number-terms'
import type { Synonyms } from '@/lib/domain/search/synonyms'

/** The n-th term (a synonym group or a measurement's value is one too) stands at [starts[n], ends[n]), UTF-16. Three lists and no objects, because a text has hundreds. */
export interface PlacedTerms { terms: readonly string[]; starts: readonly number[]; ends: readonly number[] }

/** Some ten kilobytes each. */
const mostKept = 2_000

export class PlacedTermsOfTexts {
  /** In the order of use, oldest first. */
  private readonly kept = new Map<string, PlacedTerms>()

  constructor(private readonly synonyms: Synonyms) {}

  of(text: string): PlacedTerms {
    const placed = this.kept.get(text) ?? placeTerms(text, this.synonyms)
    this.kept.delete(text)
    this.kept.set(text, placed)
    if (this.kept.size > mostKept) {
      for (const oldest of this.kept.keys()) {
        this.kept.delete(oldest)
        break
      }
    }
    return placed
  }
}

function placeTerms(text: string, synonyms: Synonyms): PlacedTerms {
  const { tokens } = analyseText(text)
  const [terms, starts, ends]: [string[], number[], number[]] = [[], [], []]
  const place = (term: string, start: number, end: number) => {
    terms.push(term)
    starts.push(start)
    ends.push(end)
  }
  for (const { term, also, start, end } of tokens) {
    place(term, start, end)
    for (const other of also) place(other, start, end)
  }
  for (const { first, last, terms: groups } of synonyms.labelText(tokens)) {
    for (const group of groups) place(group, tokens[first]?.start ?? 0, tokens[last]?.end ?? 0)
  }
  for (const value of findValues(text)) for (const term of value.terms) place(term, value.start, value.end)
  return { terms, starts, ends }
}
