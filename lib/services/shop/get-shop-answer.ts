// A shop table asked by its slug, for the API.
import 'server-only'
import type { AppContext } from '@/lib/context'
import type { RawInputs } from '@/lib/domain/shop/shop-input'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { AppError, refuse } from '@/lib/errors'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { requireMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { answerTable } from './answer-table'

/** Throws not-found for an unknown table, invalid with a path for each input that is out of its limits, or for an unknown kit. */
export async function getShopAnswer(context: AppContext, slug: string, raw: RawInputs, kit?: string): Promise<ShopAnswer> {
  const table = shopTable(slug)
  if (!table) throw refuse.notFound('This shop table')
  const answered = answerTable(table, raw, { kit, limits: await requireMakerLimits(context.reader, kit, table.slug) })
  if (answered.ok) return answered.answer
  throw new AppError('invalid', answered.errors[0]?.message ?? 'Something needs mending.', { errors: answered.errors.map(({ path, message }) => ({ path: path.slice(0, 40), message })) })
}
