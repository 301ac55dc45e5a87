// A figure as a small sign for its table: the shapes alone, cut to what they reach into. Says nothing, so it is hidden from screen readers.
import { useId } from 'react'
import type { Figure } from '@/lib/domain/shop/figures/figure'
import { shapeBounds } from '@/lib/domain/shop/figures/shape-bounds'
import { FigureShape, HatchPattern } from './shop-figure'

const MARGIN = 6

export function FigureThumb({ figure }: { figure: Figure }) {
  const id = `${useId()}-hatch`
  const { left, top, right, bottom } = shapeBounds(figure.shapes)
  const box = [left - MARGIN, top - MARGIN, right - left + 2 * MARGIN, bottom - top + 2 * MARGIN]
  return (
    <svg className="figure-thumb" viewBox={box.map((value) => Math.round(value)).join(' ')} width="176" height="104" aria-hidden="true" focusable="false">
      <HatchPattern id={id} />
      {figure.shapes.map((shape, index) => <FigureShape key={index} shape={shape} hatch={id} />)}
    </svg>
  )
}
