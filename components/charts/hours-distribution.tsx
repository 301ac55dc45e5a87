// Hours that builders told: every point while they are few, and the box of the middle half with its median. Drawn by the server; the sentence says the same.
import { axisTicks } from '@/lib/domain/evidence/axis-ticks'
import type { Brief } from '@/lib/schemas/brief'

export type Hours = NonNullable<Brief['hours']>

const size = { width: 360, left: 16, right: 16, dot: 5, boxTop: 108, boxHeight: 22, axis: 146, height: 176 }

export function HoursDistribution({ hours }: { hours: Hours }) {
  const ticks = axisTicks(hours.most)
  const end = ticks[ticks.length - 1] ?? 1
  const x = (value: number) => Math.round((size.left + (value / end) * (size.width - size.left - size.right)) * 10) / 10
  const middle = size.boxTop + size.boxHeight / 2
  const median = x(hours.median)
  return (
    <svg className="chart chart-hours" viewBox={`0 0 ${size.width} ${size.height}`} role="img" aria-label={hoursWords(hours)}>
      <text className="chart-told" x={Math.min(Math.max(median, 40), size.width - 40)} y="22" textAnchor="middle">{short(hours.median)} h</text>
      <path className="chart-line" d={`M${median} 32V${size.boxTop}`} />
      {stacked(hours.points ?? [], x).map(({ at, level }, i) => <circle key={i} className="chart-dot" cx={at} cy={size.boxTop - 10 - level * (size.dot * 2 + 1)} r={size.dot} />)}
      <path className="chart-whisker" d={`M${x(hours.least)} ${middle}H${x(hours.lower)}M${x(hours.upper)} ${middle}H${x(hours.most)}M${x(hours.least)} ${middle - 7}v14M${x(hours.most)} ${middle - 7}v14`} />
      <rect className="chart-box" x={x(hours.lower)} y={size.boxTop} width={Math.max(1, x(hours.upper) - x(hours.lower))} height={size.boxHeight} />
      <path className="chart-line" d={`M${median} ${size.boxTop}v${size.boxHeight}`} />
      <path className="chart-grid" d={`M${size.left} ${size.axis}H${size.width - size.right}`} />
      {ticks.map((tick) => (
        <g key={tick}>
          <path className="chart-tick" d={`M${x(tick)} ${size.axis}v5`} />
          <text className="chart-number" x={x(tick)} y={size.axis + 22} textAnchor="middle">{tick}</text>
        </g>
      ))}
    </svg>
  )
}

/** 'Half took 15 to 26 hours, the middle one 22; the shortest 14, the longest 31. Told by 7 builders.' */
export function hoursWords({ lower, upper, median, least, most, builders }: Hours): string {
  return `Half took ${short(lower)} to ${short(upper)} hours, the middle one ${short(median)}; the shortest ${short(least)}, the longest ${short(most)}. Told by ${builders} builders.`
}

const short = (hours: number) => String(Math.round(hours * 10) / 10)

/** Points that would lie on one another stand on top of one another. */
function stacked(points: readonly number[], x: (value: number) => number): { at: number; level: number }[] {
  const placed: { at: number; level: number }[] = []
  for (const point of points) {
    const at = x(point)
    const near = placed.filter((other) => Math.abs(other.at - at) < size.dot * 2)
    placed.push({ at, level: near.length === 0 ? 0 : Math.max(...near.map((n) => n.level)) + 1 })
  }
  return placed
}
