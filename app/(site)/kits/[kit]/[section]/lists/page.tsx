// The lists of a section: hardware with its count per side, and what can no longer be reached once it is closed.
import type { Metadata } from 'next'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { LinesForms } from '@/components/kits/lines-forms'
import { PageTitle } from '@/components/layout/page-title'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { asLines } from '@/lib/services/plans/as-lines'
import { getSectionLists } from '@/lib/services/plans/get-section-lists'
import { closingColumns } from '@/lib/services/plans/keep-closing-items'
import { hardwareColumns } from '@/lib/services/plans/keep-hardware'
import { closingLinesAction, closingRowAction, endClosingItemAction, hardwareLinesAction, hardwareRowAction } from '../../../actions'
import { atSection } from '../at-section'

export const metadata: Metadata = { title: 'Hardware and closing list' }

type Lists = Awaited<ReturnType<typeof getSectionLists>>
const originWords = { plans: 'Plans', builder: 'Builders', inspector: 'Inspectors' } as const

export default async function ListsPage({ params }: PageProps<'/kits/[kit]/[section]/lists'>) {
  const context = await pageContext()
  const lists = await atSection(params, (slug, code) => getSectionLists(context, slug, code))
  const { kit, section } = lists
  return (
    <>
      <PageTitle kicker={`${kit.name} · ${section.code} ${section.title}`} title="Hardware and closing list" lead="Kept by the group’s steward. The kit maker’s own list comes first."
        aside={<div className="button-row"><LinkButton href={paths.section(kit.slug, section.code)}>Section {section.code}</LinkButton><LinkButton href={paths.planSteps(kit.slug, section.code)}>Plan steps</LinkButton></div>} />
      <Hardware lists={lists} />
      <Closing lists={lists} />
    </>
  )
}

function Hardware({ lists: { kit, section, hardware, mayKeep } }: { lists: Lists }) {
  return (
    <Sheet as="section" labelledBy="hardware">
      <SheetHead id="hardware" title="Hardware" note={hardware.length === 0 ? 'nothing entered yet' : `${hardware.length} kinds and places`} />
      {hardware.length === 0 ? null : (
        <div className="relative overflow-x-auto" role="group" aria-label="Table of hardware" tabIndex={0}>
          <table className="w-full text-left">
            <caption className="sr-only">Hardware of this section, with its count per side</caption>
            <thead className="bg-inset"><tr>{['Designation', 'Length', 'Left', 'Right', 'Where'].map((head) => <th key={head} scope="col" className={`label px-4 py-3 ${head === 'Left' || head === 'Right' ? 'text-right' : ''}`}>{head}</th>)}</tr></thead>
            <tbody>
              {hardware.map((h) => (
                <tr key={h.id} className="border-t border-line align-baseline">
                  <th scope="row" className="code px-4 py-3 font-bold whitespace-nowrap">{h.designation}</th><td className="code px-4 py-3">{h.length}</td>
                  <td className="code px-4 py-3 text-right">{h.left}</td><td className="code px-4 py-3 text-right">{h.right}</td><td className="px-4 py-3">{h.place}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      )}
      {mayKeep ? (
        <LinesForms id="hardware" place={{ kit: kit.slug, section: section.code }} rowAction={hardwareRowAction} linesAction={hardwareLinesAction} columns={hardwareColumns} now={asLines(hardwareColumns, hardware)} button="Add this hardware"
          example={'designation,length,left,right,place\nAN3-5A,,4,4,"nose ribs, lower"'}
          fields={[
            { name: 'designation', label: 'Designation', maxLength: 60, placeholder: 'AN3-5A', autoComplete: 'off' },
            { name: 'length', label: 'Length', maxLength: 40, optional: true, autoComplete: 'off', help: 'Where the designation does not say it.' },
            { name: 'left', label: 'Left', maxLength: 5, autoComplete: 'off' }, { name: 'right', label: 'Right', maxLength: 5, autoComplete: 'off' },
            { name: 'place', label: 'Where it goes', maxLength: 300, optional: true },
          ]} />
      ) : null}
    </Sheet>
  )
}

function Closing({ lists: { kit, section, closing, mayKeep } }: { lists: Lists }) {
  const place = { kit: kit.slug, section: section.code }
  return (
    <Sheet as="section" labelledBy="closing">
      <SheetHead id="closing" title="Closing list" note={closing.length === 0 ? 'nothing entered yet' : 'before it can no longer be reached'} />
      {closing.length === 0 ? null : (
        <ol className="divide-y divide-line border-b border-line">
          {closing.map((item) => (
            <li key={item.id} className="flex flex-wrap items-baseline justify-between gap-3 px-5 py-3">
              <div className="min-w-0 flex-[1_1_20rem]"><p>{item.text}</p><p className="text-small text-ink-soft">{originWords[item.origin]}{item.reference ? ` · ${item.reference}` : ''}</p></div>
              {mayKeep ? <FieldsForm action={endClosingItemAction} id={`end-${item.id}`} hidden={{ ...place, itemId: item.id }} button="End it" look="quiet" fields={[]} about={item.text} /> : null}
            </li>
          ))}
        </ol>
      )}
      {mayKeep ? (
        <LinesForms id="closing" place={place} rowAction={closingRowAction} linesAction={closingLinesAction} columns={closingColumns} now={asLines(closingColumns, closing)} button="Add to the closing list"
          example={'text,origin,reference\n"Lock nuts of the bellcrank, paint across each",inspector,'}
          fields={[
            { name: 'text', label: 'What can no longer be reached', maxLength: 300 },
            { name: 'origin', label: 'From', kind: 'select', options: (['plans', 'builder', 'inspector'] as const).map((value) => ({ value, label: originWords[value] })) },
            { name: 'reference', label: 'Page and step, or whose experience', maxLength: 300, optional: true },
          ]} />
      ) : null}
    </Sheet>
  )
}
