// A torque wrench with its extension from above: the lever, the extension, and which way it points.
import type { ExtensionDirection } from '../torque-rules'
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface TorqueFigureInput {
  /** Inches; undefined where not given: then the figure is drawn by eye and names it. */
  lever: number | undefined
  extension: number | undefined
  direction: ExtensionDirection
}

/** `width`: pixels it will be shown at. Pull is at the right, the nut at the end of the extension. */
export function torqueFigure(given: TorqueFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const { direction } = given
  const lever = given.lever ?? 10
  const extension = given.extension ?? lever * 0.4
  const long = direction === 'longer' ? lever + extension : Math.max(lever, direction === 'shorter' ? extension : 0)
  const scale = Math.min(fit(width - 90, long), direction === 'square' ? fit(220, extension) : Infinity)
  const right = 40 + long * scale
  const drive: Point = [right - lever * scale, 90]
  const offset = extension * scale
  const nut: Point = direction === 'longer' ? [drive[0] - offset, drive[1]] : direction === 'shorter' ? [drive[0] + offset, drive[1]] : [drive[0], drive[1] + offset]
  const sketch = new Sketch({ title: 'Torque with an extension', system, width, height: nut[1] + 110, scale, byEye: given.lever === undefined || given.extension === undefined ? 'lengths not given, and widths' : 'widths' })
  sketch.rect('metal', drive[0] - 9, drive[1] - 7, right, drive[1] + 7)
  sketch.path('cut', direction === 'square' ? [[drive[0] - 6, drive[1]], [drive[0] + 6, drive[1]], [nut[0] + 6, nut[1]], [nut[0] - 6, nut[1]]] : [[drive[0], drive[1] - 5], [nut[0], nut[1] - 5], [nut[0], nut[1] + 5], [drive[0], drive[1] + 5]])
  sketch.circle('open', drive, 6)
  sketch.path('outline', hexagon(nut, 13))
  sketch.across(given.lever === undefined ? 'lever' : sketch.size(lever), drive, [right, drive[1]], { field: 'lever', lane: 36, isEntry: true })
  const extensionWords = given.extension === undefined ? 'extension' : sketch.size(extension)
  if (direction === 'square') sketch.down(extensionWords, drive, nut, { field: 'extension', lane: drive[0] + 24, isEntry: true })
  else sketch.across(extensionWords, [Math.min(drive[0], nut[0]), drive[1]], [Math.max(drive[0], nut[0]), drive[1]], { field: 'extension', lane: drive[1] + 44, isEntry: true })
  sketch.balloon(nut, 'Nut', 'the torque that counts arrives here')
  sketch.balloon(drive, 'Drive', 'where the wrench measures')
  sketch.balloon([right - 12, drive[1]], 'Grip', 'pull in the middle of the grip, square to the wrench')
  return sketch.finish()
}

function hexagon([x, y]: Point, r: number): Point[] {
  return Array.from({ length: 6 }, (_, corner) => [x + r * Math.cos((corner * Math.PI) / 3), y + r * Math.sin((corner * Math.PI) / 3)] as Point)
}
