// Geometry of the shop figures as plain data: shapes, dimension lines, balloons, in pixels of a box as wide as it is shown.
// What draws it is a component; what goes where on each figure is the file named after it.

export type Point = readonly [x: number, y: number]

/** What a shape is; the component gives it its colour, hatching or dash. */
export type ShapeRole = 'sheet' | 'cut' | 'metal' | 'rubber' | 'wire' | 'open' | 'outline' | 'hidden' | 'centre' | 'limit'

export type Shape =
  | { kind: 'path'; d: string; role: ShapeRole }
  | { kind: 'circle'; cx: number; cy: number; r: number; role: ShapeRole }
  | { kind: 'line'; from: Point; to: Point; role: ShapeRole }

export type Anchor = 'start' | 'middle' | 'end'

export interface Label {
  text: string
  at: Point
  anchor: Anchor
  /** The value is typed in here: the label takes the room of a box. */
  isEntry?: true
}

export interface Dimension {
  from: Point
  to: Point
  /** Outside a narrow span the arrows point inwards from both sides. */
  arrows: 'inside' | 'outside'
  /** From the part to the dimension line. */
  witness: readonly (readonly [Point, Point])[]
  /** `at` is the middle of the line's height. */
  label: Label
  /** Where the label had to move away from its line. */
  leader?: readonly [Point, Point]
  /** The input or the result whose value it shows. */
  field: string
}

export interface Balloon {
  n: number
  /** The feature it is about, and the centre of the numbered circle. */
  at: Point
  centre: Point
  label: string
  note: string
}

export interface Figure {
  title: string
  viewBox: readonly [x: number, y: number, width: number, height: number]
  /** Pixels to the inch, the same for everything on the figure but what `byEye` names. */
  scale: number
  shapes: readonly Shape[]
  dimensions: readonly Dimension[]
  balloons: readonly Balloon[]
  captions: readonly Label[]
  /** What is not to scale, in words; '' when all is. */
  byEye: string
}

export interface Box {
  left: number
  top: number
  right: number
  bottom: number
}

/** Width of a character and height of a line at the size labels are set in (B612, 15 px). */
export const CHARACTER = 9.6
export const LINE = 20
export const BALLOON_RADIUS = 14

/** The box one types into: wide enough for "4.76 mm", high enough for a gloved finger beside a scale drawing. */
export const ENTRY_WIDTH = 92
export const ENTRY_HEIGHT = 40

/** How wide a label stands, as a box to type into or as words. */
export function labelWidth({ text, isEntry }: Pick<Label, 'text' | 'isEntry'>): number {
  return isEntry ? Math.max(ENTRY_WIDTH, text.length * CHARACTER + 24) : text.length * CHARACTER
}

/** The room a label takes. */
export function labelBox(label: Label): Box {
  const { at: [x, y], anchor } = label
  const [width, half] = [labelWidth(label), (label.isEntry ? ENTRY_HEIGHT : LINE) / 2]
  const left = anchor === 'start' ? x : anchor === 'end' ? x - width : x - width / 2
  return { left, top: y - half, right: left + width, bottom: y + half }
}

export function balloonBox({ centre: [x, y] }: Pick<Balloon, 'centre'>): Box {
  return { left: x - BALLOON_RADIUS, top: y - BALLOON_RADIUS, right: x + BALLOON_RADIUS, bottom: y + BALLOON_RADIUS }
}

export const overlaps = (a: Box, b: Box): boolean => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom
