// A section of a build in the list of all of them: where the work stands, hours, holds; and, opened in place, the choice of its state.
import type { Route } from 'next'
import { PartTag } from '@/components/entries/part-tag'
import { Disclosure } from '@/components/ui/disclosure'
import type { FormAction } from '@/components/ui/use-form'
import { countedHolds, stateWords } from '@/lib/format/build-words'
import { formatHours } from '@/lib/format/hours'
import type { Build } from '@/lib/schemas/builds'
import { SectionStateForm } from './section-state-form'

export function SectionRow({ buildId, row, action }: { buildId: number; row: Build['sections'][number]; action: FormAction }) {
  return (
    <li className="section-row">
      <PartTag code={row.code} title={row.title} href={row.url as Route} />
      <p className="section-row-facts">{row.minutes > 0 ? <span className="whole">{formatHours(row.minutes)}</span> : null}{row.openHolds > 0 ? <b className="whole">{countedHolds(row.openHolds)}</b> : null}</p>
      <Disclosure small summary={<><span className={`state-mark state-mark-${row.state}`} aria-hidden="true" />{stateWords[row.state]}<span className="sr-only">: change the state of {row.code}</span></>}>
        <SectionStateForm action={action} buildId={buildId} section={row.code} state={row.state} />
      </Disclosure>
    </li>
  )
}
