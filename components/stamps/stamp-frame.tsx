// The outlines of stamps, without words: a double line in ink, dashed once a stamp no longer stands as pressed or is missing.

export interface StampFrameProps {
  shape: 'octagon' | 'flat'
  /** Dashed and without tint. */
  dashed?: boolean
  /** Rules above and below the mentor's mark; octagon only. */
  band?: boolean
}

const shapes = {
  octagon: {
    box: '0 0 176 176',
    outer: 'M52 2h72l50 50v72l-50 50H52L2 124V52Z',
    inner: 'M54.5 8h67L168 54.5v67L121.5 168h-67L8 121.5v-67Z',
  },
  flat: {
    box: '0 0 274 58',
    outer: 'M15 1.5h244l13.5 13.5v28L259 56.5H15L1.5 43V15Z',
    inner: 'M17 5.5h240L268.5 17v24L257 52.5H17L5.5 41V17Z',
  },
} as const

export function StampFrame({ shape, dashed = false, band = false }: StampFrameProps) {
  const { box, outer, inner } = shapes[shape]
  return (
    <svg className="stamp-frame" viewBox={box} preserveAspectRatio="none" aria-hidden="true" focusable="false">
      <path className={dashed ? undefined : 'tint'} d={outer} strokeWidth={dashed ? 2 : 3} strokeDasharray={dashed ? '7 5' : undefined} />
      {dashed ? null : <path d={inner} strokeWidth="1.25" />}
      {band ? <path d="M8.5 52h159M8.5 87.5h159" strokeWidth="1.25" strokeDasharray={dashed ? '7 5' : undefined} /> : null}
    </svg>
  )
}
