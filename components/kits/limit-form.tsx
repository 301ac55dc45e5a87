'use client'
// A steward enters one limit of the kit maker: for which inputs, how much, and where it stands. What is less safe than the handbook's is
// said before it is kept, and needs a second press. The table and the result are chosen before, on the page.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { NoticeLine } from '@/components/ui/notice-line'
import { Select } from '@/components/ui/select'
import { TextArea } from '@/components/ui/text-area'
import { TextField } from '@/components/ui/text-field'
import { useForm, type FormAction } from '@/components/ui/use-form'
import type { ShopInput } from '@/lib/domain/shop/shop-input'

export interface LimitFormProps {
  action: FormAction
  kit: string
  table: string
  result: string
  inputs: readonly Pick<ShopInput, 'name' | 'label' | 'kind' | 'unit' | 'options' | 'default'>[]
  /** Units it may be given in, the result's own first; none where the result is in words. */
  units: readonly string[]
}
type Form = ReturnType<typeof useForm>

const fieldId = (path: string) => `limit-${path}`

export function LimitForm({ action, kit, table, result, inputs, units }: LimitFormProps) {
  const shown = useForm(action)
  const { state, submit, isPending, form } = shown
  const warning = state.errors.find(({ path }) => path === 'lessSafe')?.message
  const others = state.errors.filter(({ path }) => path !== 'lessSafe')
  const errors = others.length > 0 ? others.map(({ path, message }) => ({ id: fieldId(path), message })) : state.message && !warning ? [{ message: state.message }] : []
  const [needed, more] = [inputs.filter((input) => input.default !== null), inputs.filter((input) => input.default === null)]
  const inputOf = (input: LimitFormProps['inputs'][number]) => <InputField key={input.name} input={input} shown={shown} />
  return (
    <form ref={form} action={submit} noValidate className="limit-form">
      <ErrorSummary errors={errors} />
      <input type="hidden" name="kit" value={kit} /><input type="hidden" name="table" value={table} /><input type="hidden" name="result" value={result} />
      <fieldset>
        <legend className="label">For which</legend>
        <p className="field-help">Leave it open to let it hold for all.</p>
        <div className="shop-fields">{needed.map(inputOf)}</div>
        {more.length > 0 ? <details className="shop-more" open={more.some(({ name }) => shown.valueOf(`inputs.${name}`) !== '')}><summary>Narrower still: {more.map(({ label }) => label.split(/[:,]/)[0]?.toLowerCase()).join(', ')}</summary><div className="shop-fields">{more.map(inputOf)}</div></details> : null}
      </fieldset>
      <fieldset>
        <legend className="label">The limit</legend>
        <ValueFields units={units} shown={shown} />
      </fieldset>
      <fieldset>
        <legend className="label">Where it stands</legend>
        <div className="shop-fields">
          <PlainField name="reference.title" label="Bulletin or manual" help="Such as Bulletin SB-07, or Plans W3-2, Rev C." shown={shown} maxLength={120} />
          <PlainField name="reference.section" label="Page, step or paragraph" shown={shown} maxLength={120} />
          <PlainField name="reference.year" label="Date" help="With its year: 14 Mar 2026." shown={shown} maxLength={20} />
        </div>
        <TextArea id={fieldId('note')} name="note" label="Note" optional rows={2} maxLength={500} help="What must be said beside the number, such as the parts it is for." error={shown.errorOf('note')} defaultValue={shown.valueOf('note')} />
      </fieldset>
      {warning ? <><NoticeLine boxed live><b>Less safe than the handbook.</b> {warning} The kit maker’s limit wins: if the page says so, enter it all the same.</NoticeLine><input type="hidden" name="lessSafe" value={warning} /></> : null}
      <div className="button-row"><Button type="submit" look="primary" disabled={isPending}>{warning ? 'The page is right: enter it' : 'Enter the limit'}</Button></div>
    </form>
  )
}

function ValueFields({ units, shown }: { units: readonly string[]; shown: Form }) {
  if (units.length === 0) return <PlainField name="value.words" label="In words" shown={shown} maxLength={200} />
  const unit = shown.valueOf('unit', units[0])
  return (
    <>
      <p className="field-help">One number; or at least, at most, or both; or words.</p>
      <div className="shop-fields">
        <PlainField name="value.number" label="One number" shown={shown} maxLength={60} />
        <PlainField name="value.min" label="At least" shown={shown} maxLength={60} />
        <PlainField name="value.max" label="At most" shown={shown} maxLength={60} />
        <Select key={unit} id={fieldId('unit')} name="unit" label="Unit" error={shown.errorOf('unit')} defaultValue={unit}>
          {units.map((name) => <option key={name} value={name}>{name === 'D' ? 'D, diameters of the rivet' : name}</option>)}
        </Select>
        <PlainField name="value.words" label="Or in words" shown={shown} maxLength={200} />
      </div>
    </>
  )
}

function InputField({ input, shown }: { input: LimitFormProps['inputs'][number]; shown: Form }) {
  const { name, label, kind, unit, options = [] } = input
  const path = `inputs.${name}`
  if (kind !== 'choice') return <PlainField name={path} label={label} {...(unit ? { help: `In ${unit === 'lbf-in' ? 'in-lb' : unit === 'in' ? 'inches' : unit}, or with its unit.` } : {})} shown={shown} maxLength={60} />
  const value = shown.valueOf(path)
  return (
    <Select key={value} id={fieldId(path)} name={path} label={label} error={shown.errorOf(path)} defaultValue={value}>
      <option value="">all</option>
      {options.map((option) => <option key={option.value} value={option.value}>{option.label}</option>)}
    </Select>
  )
}

interface PlainFieldProps { name: string; label: string; help?: string; maxLength: number; shown: Form }
function PlainField({ name, label, help, maxLength, shown }: PlainFieldProps) {
  return <TextField id={fieldId(name)} name={name} label={label} {...(help ? { help } : {})} error={shown.errorOf(name)} defaultValue={shown.valueOf(name)} maxLength={maxLength} autoComplete="off" spellCheck={false} />
}
