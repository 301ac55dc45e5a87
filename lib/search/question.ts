// A question made ready for one pass over the postings: its terms numbered, its concepts and routes as numbers.
import 'server-only'
import type { Concept, Route } from '@/lib/domain/search/understand-query'

interface NumberedRoute { route: Route; first: number; others: readonly number[]; weight: number; strength: number; unless: number | undefined }
interface NumberedConcept { concept: Concept; mass: number; routes: readonly NumberedRoute[] }

/** Which of a question's terms something holds. */
export type Holds = (term: number) => boolean

export class Question {
  readonly terms: readonly string[]
  readonly mass: number
  private readonly numbers = new Map<string, number>()
  private readonly concepts: readonly NumberedConcept[]
  /** Routes by each term that is part of them. */
  private readonly routesOf: readonly (readonly NumberedRoute[])[]

  constructor(concepts: readonly Concept[]) {
    // Strongest first, so that coverage can stop at the first route that holds.
    this.concepts = concepts.map((concept) => ({
      concept,
      mass: concept.mass,
      routes: [...concept.routes].sort((a, b) => b.strength - a.strength).map((route) => this.numbered(route)),
    }))
    this.terms = [...this.numbers.keys()]
    this.mass = concepts.reduce((sum, { mass }) => sum + mass, 0)
    const routes = this.concepts.flatMap((concept) => concept.routes)
    this.routesOf = this.terms.map((_, number) => routes.filter(({ first, others }) => first === number || others.includes(number)))
  }

  /** Number of a term of the question, undefined for others. */
  find(term: string): number | undefined {
    return this.numbers.get(term)
  }

  /** Share of the question that is held, 0 … 1: each concept by its strongest route. */
  coverage(holds: Holds): number {
    if (this.mass === 0) return 0
    let covered = 0
    // Plain loops: this runs for every entry that holds a word of the question.
    for (const { mass, routes } of this.concepts) {
      for (const route of routes) {
        if (!holds(route.first) || !holdsAll(route.others, holds)) continue
        covered += mass * route.strength
        break
      }
    }
    return covered / this.mass
  }

  /** Each concept with the route that `coverage` counts, null where none holds. */
  covering(holds: Holds): { concept: Concept; route: Route | null }[] {
    return this.concepts.map(({ concept, routes }) => ({
      concept, route: routes.find(({ first, others }) => holds(first) && holdsAll(others, holds))?.route ?? null,
    }))
  }

  /** Factor of a term's text score: the sum of the routes it completes. */
  weight(term: number, holds: Holds): number {
    let sum = 0
    for (const { first, others, weight, unless } of this.routesOf[term] ?? []) {
      if (unless !== undefined && holds(unless)) continue
      if (others.length === 0) sum += weight
      else if (holds(first) && holdsAll(others, holds)) sum += weight / (1 + others.length)
    }
    return sum
  }

  private numbered(route: Route): NumberedRoute {
    const { terms, weight, strength, unless } = route
    const [first = 0, ...others] = terms.map((term) => this.numberOf(term))
    return { route, first, others, weight, strength, unless: unless === undefined ? undefined : this.numberOf(unless) }
  }

  private numberOf(term: string): number {
    const known = this.numbers.get(term)
    if (known !== undefined) return known
    const number = this.numbers.size
    this.numbers.set(term, number)
    return number
  }
}

function holdsAll(terms: readonly number[], holds: Holds): boolean {
  for (const term of terms) if (!holds(term)) return false
  return true
}
