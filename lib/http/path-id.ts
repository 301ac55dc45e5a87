// An id in an address.
import { refuse } from '@/lib/errors'

/** The integer id named `name` in the address; 404 for anything else, since nothing can be there. */
export function pathId(params: Record<string, string>, name = 'id'): number {
  const text = params[name] ?? ''
  if (!/^[1-9][0-9]{0,14}$/.test(text)) throw refuse.notFound()
  return Number(text)
}
