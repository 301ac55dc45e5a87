// What a question's plans references look up: the step itself, then other steps of its page, then the page, then its section.
// Spelling is plans-reference.ts; how much nearer the step itself is, directness.ts.
import type { Token } from './analyse-text'
import { anyStepTerm, exactStepTerm, findLeadWords, findPlansReferences } from './plans-reference'
import type { Concept, Corpus, Route } from './understand-query'

export interface AskedPlace { page: string; step: string }
export interface AskedPlaces {
  places: AskedPlace[]
  concepts: Concept[]
  /** Tokens that are spoken for: they are no words to look up by themselves. */
  taken: ReadonlySet<number>
}

/** One concept a reference, of as much mass as its page is rare; none of its parts is looked up alone. */
export function readPlaces(text: string, tokens: readonly Token[], corpus: Pick<Corpus, 'frequency'>, rarityOf: (frequency: number) => number): AskedPlaces {
  const taken = new Set(findLeadWords(tokens))
  const [places, concepts] = [new Map<string, AskedPlace>(), [] as Concept[]]
  for (const { page, step, first, last } of findPlansReferences(tokens)) {
    const covered = tokens.slice(first, last + 1)
    for (let place = first; place <= last; place++) taken.add(place)
    const exact = exactStepTerm(page, step)
    if (places.has(exact)) continue
    places.set(exact, { page, step })
    const section = tokens.find((token) => token.term === page)?.also[0]
    const word = text.slice(Math.min(...covered.map((token) => token.start)), Math.max(...covered.map((token) => token.end)))
    const routes = routesTo(page, exact, section).filter(({ terms }) => terms.every((term) => corpus.frequency(term) > 0))
    concepts.push({ word, mass: rarityOf(corpus.frequency(page)), routes })
  }
  return { places: [...places.values()], concepts, taken }
}

/** An entry on the step holds the first three. */
function routesTo(page: string, exact: string, section: string | undefined): Route[] {
  return [
    { terms: [exact], weight: 2, strength: 1 },
    { terms: [anyStepTerm(page)], weight: 1.5, strength: 0.8 },
    { terms: [page], weight: 0.5, strength: 0.6 },
    // Too weak to be shown when nobody has written about the page at all.
    ...(section === undefined ? [] : [{ terms: [section], weight: 0.1, strength: 0.35 }]),
  ]
}
