// A numbered balloon on a figure and, alone, beside the note or post it is about. The leader has a halo so that it shows on dark rubber.
import { BALLOON_RADIUS, type Balloon } from '@/lib/domain/shop/figures/figure'

export function FigureBalloon({ balloon: { n, at, centre } }: { balloon: Balloon }) {
  const [dx, dy] = [centre[0] - at[0], centre[1] - at[1]]
  const length = Math.hypot(dx, dy) || 1
  const rim: readonly [number, number] = [Math.round(centre[0] - (dx / length) * BALLOON_RADIUS), Math.round(centre[1] - (dy / length) * BALLOON_RADIUS)]
  return (
    <g aria-hidden="true">
      <line x1={at[0]} y1={at[1]} x2={rim[0]} y2={rim[1]} className="figure-halo" />
      <line x1={at[0]} y1={at[1]} x2={rim[0]} y2={rim[1]} className="figure-leader" />
      <circle cx={at[0]} cy={at[1]} r="4" className="figure-point" />
      <circle cx={centre[0]} cy={centre[1]} r={BALLOON_RADIUS} className="figure-balloon" />
      <text x={centre[0]} y={centre[1]} textAnchor="middle" dominantBaseline="central" className="figure-number">{n}</text>
    </g>
  )
}

/** The number alone, to key a note or a post to the figure. `label` says it where the number alone would not. */
export function BalloonNumber({ n, label = `Balloon ${n}` }: { n: number; label?: string }) {
  return (
    <svg className="balloon-number" viewBox="0 0 32 32" width="32" height="32" role="img" aria-label={label}>
      <circle cx="16" cy="16" r="15" className="figure-balloon" />
      <text x="16" y="16" textAnchor="middle" dominantBaseline="central" className="figure-number">{n}</text>
    </svg>
  )
}
