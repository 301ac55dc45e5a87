// Narrows the rail to an operation or a section. A plain GET form: the choice stands in the address.
import type { Route } from 'next'
import { Button } from '@/components/ui/button'
import { LinkButton } from '@/components/ui/link-button'
import { Select } from '@/components/ui/select'

export interface DeskFilterProps {
  action: Route
  kits: readonly { name: string; sections: readonly { value: string; title: string }[] }[]
  operations: readonly { slug: string; title: string }[]
  /** What is chosen; '' for all. */
  section: string
  operation: string
}

export function DeskFilter({ action, kits, operations, section, operation }: DeskFilterProps) {
  const isNarrowed = section !== '' || operation !== ''
  return (
    <form action={action} method="get" className="flex flex-wrap items-end gap-3" aria-label="Narrow the rail">
      <div className="w-full sm:w-56">
        <Select id="desk-operation" name="operation" label="Operation" defaultValue={operation} key={`operation ${operation}`}>
          <option value="">All operations</option>
          {operations.map((o) => <option key={o.slug} value={o.slug}>{o.title}</option>)}
        </Select>
      </div>
      <div className="w-full sm:w-72">
        <Select id="desk-section" name="section" label="Section" defaultValue={section} key={`section ${section}`}>
          <option value="">All sections</option>
          {kits.map((kit) => <optgroup key={kit.name} label={kit.name}>{kit.sections.map((s) => <option key={s.value} value={s.value}>{s.title}</option>)}</optgroup>)}
        </Select>
      </div>
      <Button type="submit">Narrow the rail</Button>
      {isNarrowed ? <LinkButton href={action} look="quiet">Show all</LinkButton> : null}
    </form>
  )
}
