// A steward enters the kit maker's own limit, with the bulletin or page it stands on. One that allows more than the handbooks needs a
// second look before it is kept.
import 'server-only'
import { listLimitsInForce } from '@/db/queries/kit-limits'
import { kitLimit } from '@/db/schema'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { lessSafe } from '@/lib/domain/shop/less-safe'
import { limitKey } from '@/lib/domain/shop/limit-inputs'
import { readLimit } from '@/lib/domain/shop/read-limit'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { AppError, refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import type { NewLimit } from '@/lib/schemas/kit-limits'

/**
 * 403 for all but stewards; 404 for an unknown kit; 422 with each field that is wrong, and with `lessSafe` when the limit is less safe
 * than the handbook's and its sentence was not sent back; 409 when one stands for the same result and inputs.
 */
export async function enterLimit(context: AppContext, slug: string, input: NewLimit): Promise<{ id: number }> {
  const { actor, now } = context
  if (!actor) throw refuse.signIn()
  if (!can(actor, 'kit.set-limits')) throw refuse.forbidden(whyNot['kit.set-limits'])
  const read = readLimit(input)
  if (!read.ok) throw new AppError('invalid', read.errors[0]?.message ?? 'Something needs mending.', { errors: read.errors })
  const { table: name, ...limit } = read.given
  const table = shopTable(name)
  if (!table) throw refuse.invalid('table', 'Choose the shop table that the limit is for.')
  // Every case of the table is worked out here, before the write: a transaction would keep everybody waiting meanwhile.
  const warning = lessSafe(table, limit)
  return write(context.database, { actorId: actor.id, at: now }, async (tx, record) => {
    const found = await listLimitsInForce(tx, slug, name)
    if (!found) throw refuse.notFound('This kit')
    const same = found.limits.find((other) => other.result === limit.result && limitKey(table, other.inputs) === limitKey(table, limit.inputs))
    if (same) throw new AppError('conflict', `One is in force for that already: ${same.display.inch}, ${same.reference.title}. End it first.`, { current: { id: same.id } })
    if (warning && input.lessSafe !== warning) throw refuse.invalid('lessSafe', warning)
    const [row] = await tx.insert(kitLimit).values({ kitId: found.kit.id, table: name, ...limit, inputs: { ...limit.inputs }, reference: input.reference, note: input.note, enteredBy: actor.id, createdAt: now }).returning({ id: kitLimit.id })
    if (!row) throw new Error('The limit was not inserted')
    record('limit.enter', `limit:${row.id}`, `kit:${found.kit.id}`)
    return { id: row.id }
  })
}
