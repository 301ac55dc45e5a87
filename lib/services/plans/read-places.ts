// Pages and steps of a bulletin as typed, one a line. All or nothing: a bulletin that names half its pages would be worse than none.
import 'server-only'
import { refuse } from '@/lib/errors'
import { bulletinPlaceSchema, type NewBulletin } from '@/lib/schemas/plans'
import { readLines } from './read-lines'

/** Lines of page, step and revision. 422 that names the first line which could not be read. */
export function readPlaces(text: string): NewBulletin['steps'] {
  const { good, bad } = readLines(text, { columns: ['page', 'step', 'revision'], schema: bulletinPlaceSchema })
  const [first] = bad
  if (first) throw refuse.invalid('steps', `Line ${first.line}: ${first.message}`)
  return good.map((l) => l.value)
}
