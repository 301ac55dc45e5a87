// A steward's three ways to keep a list: one row typed, lines pasted after those there, or the whole list changed as text.
import { FieldsForm, type FieldsFormProps, type FormField } from '@/components/ui/fields-form'
import { Disclosure } from '@/components/ui/disclosure'

type FormAction = FieldsFormProps['action']

export interface LinesFormsProps {
  /** Unique on the page. */
  id: string
  place: { kit: string; section: string }
  rowAction: FormAction
  linesAction: FormAction
  /** Fields of one row, named as the columns. */
  fields: readonly FormField[]
  columns: readonly string[]
  example: string
  /** The list as it stands, as lines; '' while it is empty. */
  now: string
  button: string
}

export function LinesForms({ id, place, rowAction, linesAction, fields, columns, example, now, button }: LinesFormsProps) {
  const help = `Columns: ${columns.join(', ')}. Commas, semicolons or a spreadsheet’s tabs; a head line may name them. A line that cannot be read comes back with its reason, the rest is kept.`
  return (
    <div className="sheet-body lg:grid-cols-2 no-print">
      <FieldsForm action={rowAction} id={`${id}-row`} hidden={place} button={button} fields={fields} />
      <div className="grid content-start gap-4">
        <Disclosure summary="Paste lines (CSV)">
          <FieldsForm action={linesAction} id={`${id}-lines`} hidden={{ ...place, mode: 'add' }} button="Add these lines" fields={[{ name: 'lines', label: 'Lines', kind: 'area', rows: 8, placeholder: example, help }]} />
        </Disclosure>
        {now === '' ? null : (
          <Disclosure summary="Change the whole list">
            <FieldsForm key={now} action={linesAction} id={`${id}-all`} hidden={{ ...place, mode: 'replace' }} button="Put this in its place" fields={[{ name: 'lines', label: 'The list, a line each', kind: 'area', rows: 12, value: now, help: `${help} What no line names any more goes.` }]} />
          </Disclosure>
        )}
      </div>
    </div>
  )
}
