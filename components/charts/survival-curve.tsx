// The share that still waits, over time, as a stepped line from the server. What it shows stands in the sentence and the rows beside it too.
import type { SurvivalCurve } from '@/lib/domain/evidence/kaplan-meier'
import { axisTicks } from '@/lib/domain/evidence/axis-ticks'

/** `endDays`: where the axis ends; those that wait longer leave it at the right. */
interface Props { curve: SurvivalCurve; endDays: number; label: string }

const size = { width: 520, height: 300, left: 72, right: 20, top: 16, bottom: 58 }
const shares = [0, 0.25, 0.5, 0.75, 1]

export function SurvivalCurveChart({ curve, endDays, label }: Props) {
  const ticks = axisTicks(endDays)
  const end = ticks[ticks.length - 1] ?? 1
  const x = (days: number) => round(size.left + (days / end) * (size.width - size.left - size.right))
  const y = (share: number) => round(size.top + (1 - share) * (size.height - size.top - size.bottom))
  const floor = y(0)
  return (
    <svg className="chart" viewBox={`0 0 ${size.width} ${size.height}`} role="img" aria-label={label}>
      {shares.map((share) => (
        <g key={share}>
          <line className="chart-grid" x1={size.left} x2={size.width - size.right} y1={y(share)} y2={y(share)} />
          <text className="chart-number" x={size.left - 8} y={y(share) + 5} textAnchor="end">{share * 100} %</text>
        </g>
      ))}
      {ticks.map((days) => (
        <g key={days}>
          <line className="chart-tick" x1={x(days)} x2={x(days)} y1={floor} y2={floor + 6} />
          <text className="chart-number" x={x(days)} y={floor + 22} textAnchor="middle">{days}</text>
        </g>
      ))}
      <text className="chart-label" x={(size.left + size.width - size.right) / 2} y={size.height - 6} textAnchor="middle">Days since asked</text>
      {curve.median === null ? null : <path className="chart-median" d={`M${size.left} ${y(0.5)}H${x(curve.median)}V${floor}`} />}
      <path className="chart-line" d={steps(curve, x, y)} />
      {lastShare(curve) > 0 ? <path className="chart-line" d={`M${x(lastTime(curve))} ${y(lastShare(curve))}H${x(end)}`} /> : null}
    </svg>
  )
}

/** Down at each time, level between two. */
function steps({ steps: all }: SurvivalCurve, x: (days: number) => number, y: (share: number) => number): string {
  return `M${x(0)} ${y(1)}${all.map(({ time, waiting }) => `H${x(time)}V${y(waiting)}`).join('')}`
}

const lastTime = ({ steps: all }: SurvivalCurve) => all[all.length - 1]?.time ?? 0
const lastShare = ({ steps: all }: SurvivalCurve) => all[all.length - 1]?.waiting ?? 1
const round = (value: number) => Math.round(value * 100) / 100
