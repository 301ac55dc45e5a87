// How directly each entry speaks to one question: asked for slots while they are put in order, and for the hits that are shown.
import 'server-only'
import { directness, type Direct } from '@/lib/domain/search/directness'
import type { AskedPlace } from '@/lib/domain/search/place-concepts'
import { anyStepTerm, exactStepTerm } from '@/lib/domain/search/plans-reference'
import { isAbout, type OrderQuestion } from '@/lib/domain/search/task-names'
import type { AdviceFound, SearchDocument } from './messages'
import type { Holds, Question } from './question'

/** What of an entry is asked here. */
type Advising = Pick<SearchDocument, 'orderAdvice'>

export class AskedDirectly {
  /** Numbers of the terms of the steps asked for, and of their pages' steps. */
  private readonly steps: readonly number[]
  private readonly pages: readonly number[]

  constructor(question: Question, places: readonly AskedPlace[], readonly order: OrderQuestion | null) {
    const numbers = (terms: string[]) => terms.map((term) => question.find(term)).filter((number) => number !== undefined)
    this.steps = numbers(places.map(({ page, step }) => exactStepTerm(page, step)))
    this.pages = numbers(places.map(({ page }) => anyStepTerm(page)))
  }

  /** False for nearly every question: then no entry needs a look. */
  get matters(): boolean {
    return this.order !== null || this.pages.length > 0
  }

  factor(document: Advising, holds: Holds): number {
    return this.matters ? directness(this.read(document, holds)) : 1
  }

  read(document: Advising, holds: Holds): Direct {
    const place = this.steps.some(holds) ? 'step' : this.pages.some(holds) ? 'page' : null
    return { advises: this.advice(document).length > 0, place }
  }

  /** The order advice of an entry that is about the pair in question. */
  advice({ orderAdvice }: Advising): AdviceFound[] {
    const { order } = this
    if (order === null || !orderAdvice) return []
    return orderAdvice.map(({ postId, before, after }) => ({ postId, before: before.slug, after: after.slug })).filter((advice) => isAbout(advice, order))
  }
}
