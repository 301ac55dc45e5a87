// Entering a limit in two steps that work without JavaScript: what is limited, by the address; then the form for it.
import Form from 'next/form'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { LimitForm } from '@/components/kits/limit-form'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { Select } from '@/components/ui/select'
import { limitTables, unitsFor } from '@/lib/domain/shop/read-limit'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'
import { paths } from '@/lib/paths'
import { enterLimitAction } from '../actions'

/** `of` is 'rivet/edge-centre': table and result; anything else is asked for. */
export function EnterLimit({ kit, of }: { kit: string; of: string | undefined }) {
  const [slug = '', name] = (of ?? '').split('/')
  const table = limitTables(SHOP_TABLES).find((each) => each.slug === slug)
  const result = table?.results.find((each) => each.name === name)
  if (!table || !result) return <ChooseLimit kit={kit} isWrong={of !== undefined && of !== ''} />
  return (
    <Sheet as="section" labelledBy="enter">
      <SheetHead title={`${table.title}: ${result.label}`} id="enter" note="Enter a limit" />
      <div className="sheet-body grid gap-4">
        <LimitForm key={of} action={enterLimitAction} kit={kit} table={table.slug} result={result.name} units={unitsFor(table, result.name)}
          inputs={table.inputs.filter(({ kind }) => kind !== 'part').map(({ name: input, label, kind, unit, options, default: standing }) => ({ name: input, label, kind, unit, default: standing, ...(options ? { options: options.map(({ value, label: words }) => ({ value, label: words })) } : {}) }))} />
        <p><LinkButton href={paths.kitLimits(kit)} look="quiet">Something else</LinkButton></p>
      </div>
    </Sheet>
  )
}

function ChooseLimit({ kit, isWrong }: { kit: string; isWrong: boolean }) {
  return (
    <Sheet as="section" labelledBy="enter">
      <SheetHead title="Enter a limit" id="enter" />
      <div className="sheet-body">
        <Form action={paths.kitLimits(kit)} className="grid gap-4" scroll={false}>
          <Select id="of" name="of" label="What is limited" defaultValue="" error={isWrong ? 'Choose one of the results of the shop tables.' : undefined} help="By shop table.">
            <option value="">choose one</option>
            {limitTables(SHOP_TABLES).map(({ slug, title, results }) => (
              <optgroup key={slug} label={title}>{results.map(({ name, label }) => <option key={name} value={`${slug}/${name}`}>{label}</option>)}</optgroup>
            ))}
          </Select>
          <div className="button-row"><Button type="submit">Go on</Button></div>
        </Form>
      </div>
    </Sheet>
  )
}
