// The foot of a printed sheet, on paper only: when it was printed, from where, and that it has to be checked before use.
import { formatDate, type Moment } from '@/lib/format/date'

/** `address` is the absolute address of the live page. */
export function PrintNote({ address, printedAt }: { address: string, printedAt: Moment }) {
  return (
    <p className="print-only">
      <b>Check before use.</b> Printed from {address} as it stood on {formatDate(printedAt)}. Advice can be withdrawn and stamps can lapse: open the address before you drill.
    </p>
  )
}
