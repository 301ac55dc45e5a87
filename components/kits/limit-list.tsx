// A kit maker's limits in rows: what is limited, for which, how much, where it stands, and who entered it. Ending one is a child of its row.
import Link from 'next/link'
import type { ReactNode } from 'react'
import { DateText } from '@/components/ui/date-text'
import { sourceWords } from '@/lib/format/shop-words'
import { paths } from '@/lib/paths'
import type { KitLimit } from '@/lib/schemas/kit-limits'

export interface LimitListProps {
  kit: string
  limits: readonly KitLimit[]
  /** The form that ends one, for who may. */
  endOf?: (limit: KitLimit) => ReactNode
}

export function LimitList({ kit, limits, endOf }: LimitListProps) {
  return (
    <ul className="limits">
      {limits.map((limit) => (
        <li key={limit.id} id={`limit-${limit.id}`} className={limit.ended ? 'limit limit-ended' : 'limit'}>
          <div>
            <p className="label">{limit.tableTitle}</p>
            <h3>{limit.label}</h3>
            <p>for {limit.holdsFor || 'all'}</p>
          </div>
          <div>
            <p className="limit-value"><b>{limit.display.inch}</b>{limit.display.metric === limit.display.inch ? '' : <span>{limit.display.metric}</span>}</p>
            <p><b>{sourceWords(limit.reference)}</b></p>
            {limit.note ? <p>{limit.note}</p> : null}
            <p className="limit-record">
              Entered by {limit.enteredBy.name}, <DateText at={limit.createdAt} />.{limit.ended ? <> Ended <DateText at={limit.ended.at} />: {limit.ended.reason}</> : null}
              {limit.ended ? null : <> <Link href={paths.shopTable(limit.table, { ...limit.inputs, kit })}>Open the shop table<span className="sr-only"> for {limit.label}</span></Link></>}
            </p>
          </div>
          {limit.ended ? null : endOf?.(limit)}
        </li>
      ))}
    </ul>
  )
}
