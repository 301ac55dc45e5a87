// References to a step of a plans page, as people write them: W3-2 step 6, page W3-2, step 6, W3-2/6, step 6 of W3-2.
// A text that names the step holds a term for just that step, so that it is found before other steps of its page.
import type { Token } from './analyse-text'

export interface PlansReference {
  page: string
  step: string
  /** Tokens `first` … `last` spell it; the step's number is at `number`. */
  first: number
  last: number
  number: number
}

/** No text can hold this mark, so no word can be mistaken for a step. */
const stepMark = '§'
const pageForm = /^(?:[a-z]{0,3}\d{1,3}-\d{1,3}[a-z]?|[a-z]{1,3}\d{1,3})$/
/** A bare number is a page only right before its step. */
const bareForm = /^\d{1,3}$/
const stepForm = /^\d{1,3}[a-z]?$/
/** A revision may stand between page and step ("W3-2 Rev C step 6"), and nothing else. */
const mostBetween = 2
const leadWords = new Set(['page', 'pg'])
const placeLeads = new Set(['page', 'pg', 'section', 'sec', 'sect'])
const placeForm = /^(?:[a-z]{1,3}\d{1,3}(?:-\d{1,3}[a-z]?)?|\d{1,3}(?:-\d{1,3}[a-z]?)?)$/

/** Term of one step of a page. */
export const exactStepTerm = (page: string, step: string): string => `${page}${stepMark}${step}`
/** Term of any step of a page. */
export const anyStepTerm = (page: string): string => `${page}${stepMark}`

/** All references in the order of the text. Linear. */
export function findPlansReferences(tokens: readonly Token[]): PlansReference[] {
  return tokens.flatMap((token, number) => {
    const word = tokens[number - 1]
    if (token.kind !== 'number' || !stepForm.test(token.term)) return []
    // W3-2/6 is one chunk: both tokens stand at the same place.
    if (word && word.start === token.start && isPage(word)) return [reference(tokens, number - 1, number, number, token)]
    if (word?.term !== 'step') return []
    const before = pageBefore(tokens, number - 1)
    if (before !== null) return [reference(tokens, before, number, number, token)]
    const after = pageAfter(tokens, number)
    return after === null ? [] : [reference(tokens, after, number, number - 1, token)]
  })
}

/** Words that only lead to a place ("page" of "page W3-2", "sec" of "sec W-3"); a question is about what follows. */
export function findLeadWords(tokens: readonly Token[]): number[] {
  return tokens.flatMap((token, place) => {
    const next = tokens[place + 1]
    return next?.kind === 'number' && placeLeads.has(token.term) && placeForm.test(next.term) ? [place] : []
  })
}

function reference(tokens: readonly Token[], page: number, number: number, word: number, step: Token): PlansReference {
  const lead = leadWords.has(tokens[page - 1]?.term ?? '') ? page - 1 : page
  return { page: tokens[page]?.term ?? '', step: step.term, first: Math.min(lead, word), last: Math.max(page, number), number }
}

function pageBefore(tokens: readonly Token[], step: number): number | null {
  for (let place = step - 1; place >= 0 && place >= step - 1 - mostBetween; place--) {
    const token = tokens[place]
    if (!token) return null
    if (isPage(token) || (place === step - 1 && bareForm.test(token.term))) return place
    if (!isOfRevision(token)) return null
  }
  return null
}

function pageAfter(tokens: readonly Token[], number: number): number | null {
  const [next, afterNext] = [tokens[number + 1], tokens[number + 2]]
  if (next && isPage(next)) return number + 1
  return next && leadWords.has(next.term) && afterNext && isPage(afterNext) ? number + 2 : null
}

const isOfRevision = (token: Token): boolean => token.term.length === 1 || token.term === 'rev' || token.term === 'revis'
const isPage = (token: Token): boolean => token.kind === 'number' && pageForm.test(token.term)
