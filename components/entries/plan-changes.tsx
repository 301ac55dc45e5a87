// Says over a text that the plans changed since: which bulletin, which page and step, which revision carries the change.
import Link from 'next/link'
import { NoticeLine } from '@/components/ui/notice-line'
import { paths } from '@/lib/paths'

export interface ShownChange { readonly bulletin: string; readonly page: string; readonly step?: string | undefined; readonly revision?: string | undefined }

const placeWords = (c: ShownChange) => [`page ${c.page}`, ...(c.step ? [`step ${c.step}`] : []), ...(c.revision ? [`Rev ${c.revision}`] : [])].join(' ')

/** Nothing when nothing changed. With `kit` the bulletin's number leads to it; `brief` leaves the advice to the sheet. */
export function PlanChanges({ changes, kit, brief = false }: { changes: readonly ShownChange[]; kit?: string; brief?: boolean }) {
  if (changes.length === 0) return null
  const numbers = [...new Set(changes.map((c) => c.bulletin))]
  return (
    <NoticeLine icon="plans" boxed={!brief}>
      <b>Plans changed:</b>{' '}
      {numbers.map((number, i) => (
        <span key={number}>
          {i > 0 ? '; ' : ''}bulletin {kit === undefined ? number : <Link href={paths.bulletins(kit, number)}>{number}</Link>}, {changes.filter((c) => c.bulletin === number).map(placeWords).join(', ')}
        </span>
      ))}.
      {brief ? null : ' Sizes and steps in this text are from before it: measure by the page in force.'}
    </NoticeLine>
  )
}
