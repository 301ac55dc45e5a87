// How a question's numbers are looked up by value: other routes of the same concept, beside the number as written, which stays the strongest.
import type { Measurement } from '../measurements/measurement'
import type { Token } from './analyse-text'
import { equalTerms, mark, measureSentences } from './number-terms'
import { facingCells } from './range-cells'
import type { Route } from './understand-query'

interface ValueRoute { term: string; weight: number; strength: number }
export interface ValueOfTokens {
  /** The tokens of the question that say it, its unit among them. */
  tokens: readonly Token[]
  routes: readonly ValueRoute[]
  /** The unit was said: the same digits with another unit are another thing. */
  hasUnit: boolean
}

const equal = { weight: 0.5, strength: 0.95 }
/** A value within a range, or a range around it. */
const within = { weight: 0.25, strength: 0.7 }
/** What the number as written counts where its unit was said: an entry that says the unit too is found by its value. */
const withoutUnit = 0.4
const unitKinds: ReadonlySet<Measurement['kind']> = new Set(['length', 'torque', 'pressure', 'angle', 'temperature'])
const unitSign = /[\p{L}°"″]/u
/** Of a range that many values lie in, those that most entries hold. */
const mostWithin = 8

/** The measurements of a question with the routes that its corpus knows; `frequency` counts the entries that hold a term. */
export function findValueRoutes(text: string, tokens: readonly Token[], frequency: (term: string) => number): ValueOfTokens[] {
  return measureSentences(text).flatMap((measurement) => {
    const said = tokens.filter(({ start, end }) => start < measurement.end && measurement.start < end)
    const numbers = said.filter(({ kind }) => kind !== 'unit').length
    const routes = routesOf(measurement, frequency).map((route) => ({ ...route, weight: route.weight / Math.max(1, numbers) }))
    return said.length > 0 ? [{ tokens: said, routes, hasUnit: unitKinds.has(measurement.kind) && unitSign.test(measurement.raw) }] : []
  })
}

/** All routes of a token that helps to say a value. Its unit is held by what holds the value, and adds nothing to the score by itself. */
export function joinRoutes(written: readonly Route[], token: Token, { routes, hasUnit }: ValueOfTokens): Route[] {
  const byValue = routes.map(({ term, weight, strength }) => ({ terms: [term], weight: token.kind === 'unit' ? 0 : weight, strength }))
  return [...(hasUnit && token.kind === 'number' ? written.flatMap((route) => byUnit(route, routes)) : written), ...byValue]
}

/** The number as written, in full only together with its value: 2.5 N·m is not 2.5 mm. */
function byUnit({ terms, weight, strength }: Route, routes: readonly ValueRoute[]): Route[] {
  return [
    { terms, weight: weight * withoutUnit, strength: strength * withoutUnit },
    ...routes.map(({ term }) => ({ terms: [...terms, term], weight: weight * (1 - withoutUnit), strength })),
  ]
}

function routesOf(measurement: Measurement, frequency: (term: string) => number): ValueRoute[] {
  const known = (tokens: readonly string[]) => tokens.map(mark).filter((term) => frequency(term) > 0)
  const inside = known(facingCells(measurement)).sort((a, b) => frequency(b) - frequency(a)).slice(0, mostWithin)
  return [
    ...known(equalTerms(measurement)).map((term) => ({ term, ...equal })),
    ...inside.map((term) => ({ term, ...within })),
  ]
}
