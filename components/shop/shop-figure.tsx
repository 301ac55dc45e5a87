// Draws a figure of lib/domain/shop/figures: shapes to scale, dimension lines, numbered balloons. Knows no table; colours are classes
// of shop.css. Text scales with an SVG's box, so a figure is made for the width it is shown at and never stretched.
import { useId, type ReactNode } from 'react'
import type { Dimension, Figure, Label, Shape } from '@/lib/domain/shop/figures/figure'
import { labelBox } from '@/lib/domain/shop/figures/figure'
import { figureWords } from '@/lib/domain/shop/figures/figure-words'
import { FigureBalloon } from './figure-balloon'
import { arrowPaths } from './arrow-paths'

export interface ShopFigureProps {
  figure: Figure
  /** The box to type into for a dimension that is an input, or null to show its value as words. */
  entryFor?: (field: string) => ReactNode
}

export function ShopFigure({ figure, entryFor }: ShopFigureProps) {
  const id = useId()
  const [x, y, width, height] = figure.viewBox
  const hatch = `${id}-hatch`
  // With boxes to type into it is a group, since nothing inside an image can be reached.
  return (
    <svg className="shop-figure" viewBox={`${x} ${y} ${width} ${height}`} width={width} height={height} role={entryFor ? 'group' : 'img'} aria-labelledby={`${id}-title`} aria-describedby={`${id}-words`}>
      <title id={`${id}-title`}>{figure.title}</title>
      <desc id={`${id}-words`}>{figureWords(figure)}</desc>
      <HatchPattern id={hatch} />
      <g aria-hidden="true">
        {figure.shapes.map((shape, index) => <FigureShape key={index} shape={shape} hatch={hatch} />)}
        {figure.captions.map((caption) => <FigureText key={caption.text + caption.at[0]} label={caption} className="figure-caption" />)}
        {figure.dimensions.map((dimension, index) => <DimensionLine key={index} dimension={dimension} />)}
      </g>
      {figure.balloons.map((balloon) => <FigureBalloon key={balloon.n} balloon={balloon} />)}
      {figure.dimensions.map(({ field, label }, index) => <DimensionLabel key={index} label={label} entry={label.isEntry ? entryFor?.(field) : null} />)}
    </svg>
  )
}

/** Hatching of cut sheet, at 45 degrees as on a drawing. */
export function HatchPattern({ id }: { id: string }) {
  return (
    <defs>
      <pattern id={id} width="6" height="6" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
        <rect width="6" height="6" className="figure-hatch-ground" />
        <line x1="0" y1="0" x2="0" y2="6" className="figure-hatch" />
      </pattern>
    </defs>
  )
}

export function FigureShape({ shape, hatch }: { shape: Shape; hatch: string }) {
  const look = { className: `figure-${shape.role}`, ...(shape.role === 'cut' ? { fill: `url(#${hatch})` } : {}) }
  if (shape.kind === 'circle') return <circle cx={shape.cx} cy={shape.cy} r={shape.r} {...look} />
  if (shape.kind === 'line') return <line x1={shape.from[0]} y1={shape.from[1]} x2={shape.to[0]} y2={shape.to[1]} {...look} />
  return <path d={shape.d} {...look} />
}

function DimensionLine({ dimension }: { dimension: Dimension }) {
  const { line, heads } = arrowPaths(dimension)
  return (
    <>
      {dimension.witness.map(([from, to], index) => <line key={index} x1={from[0]} y1={from[1]} x2={to[0]} y2={to[1]} className="figure-witness" />)}
      {dimension.leader ? <line x1={dimension.leader[0][0]} y1={dimension.leader[0][1]} x2={dimension.leader[1][0]} y2={dimension.leader[1][1]} className="figure-witness" /> : null}
      <path d={line} className="figure-dimension" />
      <path d={heads} className="figure-arrow" />
    </>
  )
}

/** Words on paper and without JavaScript; a box to type into otherwise. */
function DimensionLabel({ label, entry }: { label: Label; entry: ReactNode }) {
  const box = labelBox(label)
  if (!entry) return <FigureText label={label} className="figure-label" isHidden />
  return (
    <>
      <FigureText label={label} className="figure-label figure-label-typed" isHidden />
      <foreignObject x={box.left} y={box.top} width={box.right - box.left} height={box.bottom - box.top} className="figure-entry">{entry}</foreignObject>
    </>
  )
}

function FigureText({ label: { text, at, anchor }, className, isHidden = false }: { label: Label; className: string; isHidden?: boolean }) {
  return <text x={at[0]} y={at[1]} textAnchor={anchor} dominantBaseline="central" className={className} aria-hidden={isHidden || undefined}>{text}</text>
}
