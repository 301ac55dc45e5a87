// Collects a figure and places its labels and balloons so that none lies on another: extremes included. Knows nothing of rivets.
import { fractionOfInch } from '../exact-fraction'
import { decimalInches, millimetres } from '../shop-result'
import { shapeBounds } from './shape-bounds'
import { balloonBox, BALLOON_RADIUS, ENTRY_HEIGHT, labelBox, labelWidth, LINE, overlaps, type Anchor, type Balloon, type Box, type Dimension, type Figure, type Label, type Point, type Shape, type ShapeRole } from './figure'

const ARROW = 12
const TAIL = 16
const MARGIN = 4
const GAP = 4

/** Which lengths stand on the dimension lines. */
export type LengthSystem = 'inch' | 'metric'

interface SketchOptions {
  title: string
  /** Pixels; the height is what may be used, the figure is cut to what it needs. */
  width: number
  height: number
  /** Pixels to the inch. */
  scale: number
  /** What is not to scale, in words. */
  byEye?: string
  system: LengthSystem
}

interface DimensionOptions {
  field: string
  /** Where the line stands: y of a horizontal one, x of a vertical one. */
  lane: number
  /** One types the value into this dimension. */
  isEntry?: true
  /** Where the words don't fit into a horizontal line they stand centred under it, and not beside it. */
  isUnder?: true
  /** The words of a vertical line stand at its left while there is room. */
  isLeft?: true
  /** Middle of the words of a vertical line, where that isn't the middle of the line. */
  labelAt?: number
}

/** Draws in pixels. Dimensions are placed in the order they come, balloons after them, whatever the order of the calls. */
export class Sketch {
  private readonly shapes: Shape[] = []
  private readonly captions: Label[] = []
  private readonly pending: Dimension[] = []
  private readonly wanted: { at: Point; label: string; note: string }[] = []

  private readonly title: string
  private readonly width: number
  private height: number
  private readonly scale: number
  private readonly byEye: string
  private readonly system: LengthSystem

  constructor({ title, width, height, scale, byEye = '', system }: SketchOptions) {
    this.title = title
    this.width = width
    this.height = height
    this.scale = scale
    this.byEye = byEye
    this.system = system
  }

  /** A length as it stands on a dimension line: a fraction where it is one, or millimetres. */
  size(inches: number): string {
    return this.system === 'metric' ? millimetres(inches) : (fractionOfInch(inches) ?? decimalInches(inches))
  }

  /** The same, never a fraction: sheet, drills, gaps. */
  decimal(inches: number, places = 3): string {
    return this.system === 'metric' ? millimetres(inches) : decimalInches(inches, places)
  }

  /** A length inside a sentence. */
  length(inches: number): string {
    return `${this.size(inches)} ${this.system === 'metric' ? 'mm' : 'in'}`
  }

  path(role: ShapeRole, points: readonly Point[], closed = true): void {
    const d = points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${round(x)} ${round(y)}`).join(' ')
    this.shapes.push({ kind: 'path', d: closed ? `${d} Z` : d, role })
  }

  /** A path in SVG's own words, for arcs. */
  curve(role: ShapeRole, d: string): void {
    this.shapes.push({ kind: 'path', d, role })
  }

  rect(role: ShapeRole, left: number, top: number, right: number, bottom: number): void {
    this.path(role, [[left, top], [right, top], [right, bottom], [left, bottom]])
  }

  circle(role: ShapeRole, [cx, cy]: Point, r: number): void {
    this.shapes.push({ kind: 'circle', cx: round(cx), cy: round(cy), r: round(r), role })
  }

  line(role: ShapeRole, from: Point, to: Point): void {
    this.shapes.push({ kind: 'line', from: rounded(from), to: rounded(to), role })
  }

  caption(text: string, at: Point, anchor: Anchor = 'start'): void {
    this.captions.push({ text, at: rounded(at), anchor })
  }

  /** A horizontal dimension from (x1, y1) to (x2, y2), its line at y = lane. */
  across(label: string, [x1, y1]: Point, [x2, y2]: Point, { field, lane, isEntry, isUnder }: DimensionOptions): void {
    const words = { text: label, ...(isEntry ? { isEntry } : {}) }
    const wide = labelWidth(words)
    const fits = x2 - x1 >= wide + 2 * ARROW + 2 * GAP
    const right = x2 + TAIL + GAP + wide <= this.width - MARGIN
    const text: Label = fits ? { ...words, at: [(x1 + x2) / 2, lane], anchor: 'middle' }
      : isUnder ? { ...words, at: [(x1 + x2) / 2, lane + (isEntry ? ENTRY_HEIGHT : LINE) / 2 + ARROW / 2], anchor: 'middle' }
      : right ? { ...words, at: [x2 + TAIL + GAP, lane], anchor: 'start' } : { ...words, at: [x1 - TAIL - GAP, lane], anchor: 'end' }
    this.pending.push({ from: [x1, lane], to: [x2, lane], arrows: x2 - x1 >= 2 * ARROW + GAP ? 'inside' : 'outside', label: text, field, witness: [[[x1, y1], [x1, lane]], [[x2, y2], [x2, lane]]] })
  }

  /** A vertical dimension from (x1, y1) down to (x2, y2), its line at x = lane, its label beside it. */
  down(label: string, [x1, y1]: Point, [x2, y2]: Point, { field, lane: wished, isEntry, isLeft, labelAt = (y1 + y2) / 2 }: DimensionOptions): void {
    const words = { text: label, ...(isEntry ? { isEntry } : {}) }
    const lane = Math.min(Math.max(wished, MARGIN), this.width - MARGIN)
    const [wide, room] = [labelWidth(words), { left: lane - GAP * 2 - MARGIN, right: this.width - MARGIN - lane - GAP * 2 }]
    const right = isLeft && room.left >= wide ? false : room.right >= wide
    const text: Label = { ...words, at: [right ? lane + GAP * 2 : lane - GAP * 2, labelAt], anchor: right ? 'start' : 'end' }
    this.pending.push({ from: [lane, y1], to: [lane, y2], arrows: y2 - y1 >= 2 * ARROW + GAP ? 'inside' : 'outside', label: text, field, witness: [[[x1, y1], [lane, y1]], [[x2, y2], [lane, y2]]] })
  }

  balloon(at: Point, label: string, note: string): void {
    this.wanted.push({ at, label, note })
  }

  /** Places what was collected. The box grows downwards when a label finds no room. */
  finish(): Figure {
    const taken: Box[] = this.captions.map(labelBox)
    const dimensions = this.pending.map((dimension) => this.placeDimension(dimension, taken))
    const balloons = this.wanted.map((wanted, index) => this.placeBalloon(wanted, index + 1, taken))
    const lines = dimensions.flatMap(({ from, to, witness }) => [from, to, ...witness.flat()].map(([, y]) => y))
    const used = Math.max(shapeBounds(this.shapes).bottom, ...taken.map(({ bottom }) => bottom), ...lines)
    return { title: this.title, viewBox: [0, 0, this.width, Math.ceil(Math.min(this.height, used + MARGIN))], scale: this.scale, shapes: this.shapes, dimensions, balloons, captions: this.captions, byEye: this.byEye }
  }

  private placeDimension(dimension: Dimension, taken: Box[]): Dimension {
    const { label } = dimension
    const [x, y] = label.at
    const clampedX = this.clampX(label, x)
    const offsets = [0, 1, -1, 2, -2, 3, -3, 4, -4, 5, -5, 6, -6].map((step) => step * (LINE + 2))
    const placed = this.firstFree(offsets.map((dy) => ({ ...label, at: [clampedX, y + dy] as Point })), labelBox, taken)
      ?? { ...label, at: [clampedX, this.below(taken) + ENTRY_HEIGHT / 2] as Point }
    taken.push(this.keep(labelBox(placed)))
    const moved = Math.abs(placed.at[1] - y) > 1
    const middle: Point = [(dimension.from[0] + dimension.to[0]) / 2, (dimension.from[1] + dimension.to[1]) / 2]
    const tidy = { ...dimension, from: rounded(dimension.from), to: rounded(dimension.to), witness: dimension.witness.map(([a, b]) => [rounded(a), rounded(b)] as const), label: { ...placed, at: rounded(placed.at) } }
    return moved ? { ...tidy, leader: [rounded(middle), rounded(placed.at)] } : tidy
  }

  private placeBalloon({ at, label, note }: { at: Point; label: string; note: string }, n: number, taken: Box[]): Balloon {
    const candidates = [44, 64, 88, 120].flatMap((far) => [-45, -135, 45, 135, -90, 90, 0, 180].map((degrees) => {
      const angle = (degrees * Math.PI) / 180
      return { centre: [at[0] + far * Math.cos(angle), at[1] + far * Math.sin(angle)] as Point }
    }))
    const inset = MARGIN + BALLOON_RADIUS
    const { centre } = this.firstFree(candidates, balloonBox, taken) ?? { centre: [Math.min(Math.max(at[0], inset), this.width - inset), this.below(taken) + BALLOON_RADIUS + GAP] as Point }
    taken.push(this.keep(balloonBox({ centre })))
    return { n, at: rounded(at), centre: rounded(centre), label, note }
  }

  private firstFree<T>(candidates: readonly T[], boxOf: (candidate: T) => Box, taken: readonly Box[]): T | null {
    return candidates.find((candidate) => {
      const box = boxOf(candidate)
      const inside = box.left >= 0 && box.right <= this.width && box.top >= 0 && box.bottom <= this.height
      return inside && taken.every((other) => !overlaps(box, other))
    }) ?? null
  }

  private clampX(label: Label, x: number): number {
    const { anchor } = label
    const width = labelWidth(label)
    const [low, high] = anchor === 'start' ? [0, this.width - width] : anchor === 'end' ? [width, this.width] : [width / 2, this.width - width / 2]
    return Math.min(Math.max(x, low), Math.max(low, high))
  }

  private below(taken: readonly Box[]): number {
    return Math.max(this.height, ...taken.map(({ bottom }) => bottom)) + GAP
  }

  private keep(box: Box): Box {
    this.height = Math.max(this.height, box.bottom + MARGIN)
    return box
  }
}

const round = (value: number): number => Math.round(value * 100) / 100
const rounded = ([x, y]: Point): Point => [round(x), round(y)]

/** Pixels to the inch so that `inches` fit into `pixels`, never more than `most`: a figure need not fill its box. */
export function fit(pixels: number, inches: number, most = 700): number {
  return Math.min(most, pixels / Math.max(inches, 1e-6))
}
