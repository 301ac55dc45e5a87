// The wall chart: every number, letter and fraction drill by size, in columns for one sheet of paper.
import type { Drill } from '@/lib/domain/shop/drill-series'
import { decimalInches, millimetres } from '@/lib/domain/shop/shop-result'

export function DrillChart({ drills }: { drills: readonly Drill[] }) {
  return (
    <ol className="drill-chart">
      {drills.map(({ name, inches, series }) => (
        <li key={name} className={`drill-${series}`}><b>{name}</b> <span>{decimalInches(inches, 4)}</span> <span className="drill-metric">{millimetres(inches)}</span></li>
      ))}
    </ol>
  )
}
