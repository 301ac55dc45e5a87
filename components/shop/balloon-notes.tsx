// The notes of a figure, keyed by balloon number.
import type { Balloon } from '@/lib/domain/shop/figures/figure'
import { BalloonNumber } from './figure-balloon'

export function BalloonNotes({ balloons }: { balloons: readonly Balloon[] }) {
  if (balloons.length === 0) return null
  return (
    <ol className="balloon-notes">
      {balloons.map(({ n, label, note }) => (
        <li key={n}><BalloonNumber n={n} /><span><b>{label}</b> <span className="balloon-note">{note}</span></span></li>
      ))}
    </ol>
  )
}
