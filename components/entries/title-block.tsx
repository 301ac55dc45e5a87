// The title block along the bottom of a sheet, or standing alone under a page title: labelled cells, and the stamps beside them.
import type { ReactNode } from 'react'

export interface TitleBlockCell {
  readonly label: string
  readonly value: ReactNode
  /** `full` takes a line of its own, `half` shares one with its neighbour, `long` takes what is left and wraps; otherwise a cell is as wide as its words. */
  readonly width?: 'full' | 'half' | 'long'
}

export interface TitleBlockProps {
  cells: readonly TitleBlockCell[]
  /** The stamps cell: its label ("Stamps · 1 of 2") and content. */
  stamps?: { readonly label: string, readonly content: ReactNode }
  /** Bordered all round, on sheet colour. */
  alone?: boolean
}

function cellClass(width: TitleBlockCell['width']): string {
  return width ? `title-block-cell title-block-${width}` : 'title-block-cell'
}

export function TitleBlock({ cells, stamps, alone = false }: TitleBlockProps) {
  return (
    <div className={alone ? 'title-block title-block-alone' : 'title-block'}>
      <dl>
        {cells.map((cell) => (
          <div key={cell.label} className={cellClass(cell.width)}>
            <dt className="label">{cell.label}</dt>
            <dd>{cell.value}</dd>
          </div>
        ))}
      </dl>
      {stamps ? (
        <div className="title-block-stamps">
          <p className="label">{stamps.label}</p>
          {stamps.content}
        </div>
      ) : null}
    </div>
  )
}
