// One answer of a shop table as pages and API show it: results with their labels, what was understood, cautions, permanent link.
import 'server-only'
import { tableFigures } from '@/lib/domain/shop/figures/table-figures'
import { linkInputs, readAs } from '@/lib/domain/shop/input-words'
import { withMakerLimits, type MakerLimit } from '@/lib/domain/shop/maker-limits'
import type { InputError, RawInputs } from '@/lib/domain/shop/shop-input'
import type { ShopResult, ShopTable } from '@/lib/domain/shop/shop-table'
import { paths } from '@/lib/paths'
import type { ShopAnswer, ShopAnswerResult } from '@/lib/schemas/shop'
import { shopCautions } from './shop-cautions'

interface Beside {
  /** What was understood, where the inputs came from words; otherwise the inputs themselves are named. */
  readAs?: string
  alternatives?: ShopAnswer['alternatives']
  /** The kit maker's own limits, which come before the handbook's. */
  limits?: readonly MakerLimit[]
  /** Slug of the kit they are of: the permanent link keeps it. */
  kit?: string | undefined
}
export type TableAnswer = { ok: true; answer: ShopAnswer } | { ok: false; errors: InputError[] }

/** Any width gives the same balloons; only their places differ. */
const FIGURE_WIDTH = 640

/** Never throws: inputs out of limits come back as errors that name the field. */
export function answerTable(table: ShopTable, raw: RawInputs, beside: Beside = {}): TableAnswer {
  const outcome = table.compute(raw)
  if (!outcome.ok) return outcome
  const results = withMakerLimits(table, outcome.inputs, outcome.results, beside.limits ?? [])
  const balloons = tableFigures(table.slug, outcome.inputs, results, FIGURE_WIDTH).flatMap((figure) => figure.balloons.map(({ n, label, note }) => ({ n, label, note })))
  const answer: ShopAnswer = {
    table: table.slug, inputs: { ...outcome.inputs }, readAs: beside.readAs ?? readAs(table, outcome.inputs), alternatives: beside.alternatives ?? [],
    results: results.map((result) => labelled(table, result)), cautions: shopCautions(table), url: paths.shopTable(table.slug, { ...linkInputs(table, raw), ...(beside.kit ? { kit: beside.kit } : {}) }), balloons,
  }
  return { ok: true, answer }
}

function labelled(table: ShopTable, result: ShopResult): ShopAnswerResult {
  return { ...result, label: table.results.find(({ name }) => name === result.name)?.label ?? result.name }
}
