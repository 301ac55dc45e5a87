// The figures of an answer, drawn for a desk and for a phone: text scales with an SVG's box, so each width has its own drawing and
// the style sheet shows one. With `entries`, dimensions that are inputs can be typed into. Their notes are balloon-notes.tsx.
import type { Figure } from '@/lib/domain/shop/figures/figure'
import { DimensionField } from './dimension-field'
import { ShopFigure } from './shop-figure'

/** Pixels: a sheet's column on a desk, and what a 390 px phone leaves. */
export const figureWidths = { desk: 640, phone: 340 } as const

/** What one types into a dimension: the form field it goes to, its label, what it holds now. */
export interface FigureEntry {
  fieldId: string
  label: string
  value: string
}

export interface ShopFiguresProps {
  /** The same figures at both widths of `figureWidths`. */
  desk: readonly Figure[]
  phone: readonly Figure[]
  /** By field of a dimension; absent where the figure only shows. */
  entries?: Readonly<Record<string, FigureEntry>> | undefined
}

export function ShopFigures({ desk, phone, entries }: ShopFiguresProps) {
  return (
    <div className="shop-figures">
      <div className="shop-figures-desk">{desk.map((figure) => <Drawing key={figure.title} figure={figure} entries={entries} />)}</div>
      <div className="shop-figures-phone">{phone.map((figure) => <Drawing key={figure.title} figure={figure} entries={entries} />)}</div>
    </div>
  )
}

function Drawing({ figure, entries }: { figure: Figure; entries: ShopFiguresProps['entries'] }) {
  const entryFor = (field: string) => {
    const entry = entries?.[field]
    const shown = figure.dimensions.find((dimension) => dimension.field === field)?.label.text ?? ''
    return entry ? <DimensionField fieldId={entry.fieldId} label={`${entry.label}, on the figure`} value={entry.value} placeholder={shown} /> : null
  }
  return (
    <figure className="shop-drawing">
      <ShopFigure figure={figure} {...(entries ? { entryFor } : {})} />
      <figcaption>{figure.title}, {figure.byEye ? `to scale but for ${figure.byEye}` : 'to scale'}</figcaption>
    </figure>
  )
}
