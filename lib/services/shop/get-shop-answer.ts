// A shop table asked by its slug, for the API.
import 'server-only'
import type { RawInputs } from '@/lib/domain/shop/shop-input'
import { shopTable } from '@/lib/domain/shop/shop-tables'
import { AppError, refuse } from '@/lib/errors'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { answerTable } from './answer-table'

/** Throws not-found for an unknown table, invalid with a path for each input that is out of its limits. */
export function getShopAnswer(slug: string, raw: RawInputs): ShopAnswer {
  const table = shopTable(slug)
  if (!table) throw refuse.notFound('This shop table')
  const answered = answerTable(table, raw)
  if (answered.ok) return answered.answer
  throw new AppError('invalid', answered.errors[0]?.message ?? 'Something needs mending.', { errors: answered.errors.map(({ path, message }) => ({ path: path.slice(0, 40), message })) })
}
