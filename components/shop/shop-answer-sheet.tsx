// The sheet of an open table: the answer with boxes on its dimensions, then the form. While an input is out of limits, the form alone.
import { Sheet } from '@/components/entries/sheet'
import type { InputError } from '@/lib/domain/shop/shop-input'
import type { ShopTable } from '@/lib/domain/shop/shop-table'
import type { FirstSystem } from '@/lib/format/shop-words'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { ShopAnswerView } from './shop-answer-view'
import type { FigureEntry } from './shop-figures'
import { shopFieldId, ShopForm, type ShopFormProps } from './shop-form'

export interface ShopAnswerSheetProps {
  table: Pick<ShopTable, 'slug' | 'inputs'>
  /** Null while an input is out of its limits. */
  answer: ShopAnswer | null
  values: Readonly<Record<string, string>>
  errors: readonly InputError[]
  first: FirstSystem
  /** What the address says about units, kept by the form. */
  units?: string | undefined
  /** Kits whose makers' limits can be chosen, and the chosen one. */
  kits?: ShopFormProps['kits']
  kit?: string | undefined
}

export function ShopAnswerSheet({ table, answer, values, errors, first, units, kits, kit }: ShopAnswerSheetProps) {
  return (
    <Sheet as="section">
      {answer ? <ShopAnswerView answer={answer} first={first} entries={entriesOf(table, values)} /> : null}
      <ShopForm slug={table.slug} inputs={table.inputs} values={values} errors={errors} units={units} kits={kits} kit={kit} />
    </Sheet>
  )
}

/** Every input that is no choice can be typed into the figure where the figure has it as a dimension. */
function entriesOf(table: Pick<ShopTable, 'inputs'>, values: Readonly<Record<string, string>>): Record<string, FigureEntry> {
  return Object.fromEntries(table.inputs.filter(({ kind }) => kind !== 'choice').map(({ name, label }) => [name, { fieldId: shopFieldId(name), label, value: values[name] ?? '' }]))
}
