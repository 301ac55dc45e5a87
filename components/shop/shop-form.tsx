// The inputs of a shop table as a form that sends a query: it works without JavaScript. What may be left out stands behind a summary.
import Form from 'next/form'
import { Button } from '@/components/ui/button'
import { Select } from '@/components/ui/select'
import { TextField } from '@/components/ui/text-field'
import type { InputError, ShopInput } from '@/lib/domain/shop/shop-input'
import { inputHelp } from '@/lib/format/shop-words'
import { paths } from '@/lib/paths'
import { ShopFormScript } from './shop-form-script'

const formId = 'shop-inputs'
/** The id of an input's field, for the error summary and the figure's boxes. */
export const shopFieldId = (name: string): string => `in-${name}`

export interface ShopFormProps {
  slug: string
  inputs: readonly ShopInput[]
  /** What the address says or the table assumes, by input name; '' where nothing is given. */
  values: Readonly<Record<string, string>>
  errors: readonly InputError[]
  /** Travels along, so that a change of inputs keeps the reader's units. */
  units?: string | undefined
  /** Kits whose makers' limits can be chosen: with none there is nothing to choose. */
  kits?: readonly { slug: string; name: string; maker: string }[] | undefined
  kit?: string | undefined
}

export function ShopForm({ slug, inputs, values, errors, units, kits = [], kit }: ShopFormProps) {
  const [needed, others] = [inputs.filter((input) => input.default !== null), inputs.filter((input) => input.default === null)]
  const isOpen = others.some(({ name }) => (values[name] ?? '') !== '' || errors.some(({ path }) => path === name))
  const field = (input: ShopInput) => <ShopField key={input.name} input={input} value={values[input.name] ?? ''} error={errors.find(({ path }) => path === input.name)?.message} />
  return (
    <Form action={paths.shopTable(slug)} scroll={false} id={formId} className="shop-form no-print" aria-label="What you have" noValidate>
      {units ? <input type="hidden" name="units" value={units} /> : null}
      <div className="shop-fields">{needed.map(field)}{kits.length > 0 ? <KitField kits={kits} kit={kit} /> : null}</div>
      {others.length > 0 ? (
        <details className="shop-more" open={isOpen}>
          <summary>More you can give: {others.map(({ label }) => label.split(/[:,]/)[0]?.toLowerCase()).join(', ')}</summary>
          <div className="shop-fields">{others.map(field)}</div>
        </details>
      ) : null}
      <div className="button-row without-script"><Button type="submit" look="primary">Work it out</Button></div>
      <ShopFormScript formId={formId} values={{ ...values, kit: kit ?? '' }} />
    </Form>
  )
}

function KitField({ kits, kit }: { kits: NonNullable<ShopFormProps['kits']>; kit: string | undefined }) {
  return (
    <Select id={shopFieldId('kit')} name="kit" label="Kit" help="Its maker’s own limits come before the handbook’s." defaultValue={kit ?? ''}>
      <option value="">handbooks only</option>
      {kits.map(({ slug, name, maker }) => <option key={slug} value={slug}>{name}, {maker}</option>)}
    </Select>
  )
}

function ShopField({ input, value, error }: { input: ShopInput; value: string; error: string | undefined }) {
  const { name, label, kind, options = [], default: standing } = input
  const shared = { id: shopFieldId(name), name, label, error, optional: standing === null, help: inputHelp(input) }
  if (kind !== 'choice') return <TextField {...shared} defaultValue={value} maxLength={60} autoComplete="off" autoCapitalize="off" spellCheck={false} />
  const known = options.find((option) => [option.value, ...(option.aliases ?? [])].some((alias) => alias.toLowerCase() === value.toLowerCase()))
  return (
    <Select {...shared} defaultValue={known?.value ?? ''}>
      {standing === null || !known ? <option value="">{standing === null ? 'not given' : 'choose one'}</option> : null}
      {options.map((option) => <option key={option.value} value={option.value}>{option.label}</option>)}
    </Select>
  )
}
