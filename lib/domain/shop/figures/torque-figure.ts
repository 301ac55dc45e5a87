// A torque wrench with its extension from above: the lever, the extension, and which way it points.
import { decimalInches } from '../shop-result'
import { fractionOfInch } from '../exact-fraction'
import type { ExtensionDirection } from '../torque-rules'
import type { Figure, Point } from './figure'
import { fit, Sketch } from './sketch'

export interface TorqueFigureInput {
  /** Inches. */
  lever: number
  extension: number
  direction: ExtensionDirection
}

const words = (inches: number): string => fractionOfInch(inches) ?? decimalInches(inches)

/** `width`: pixels it will be shown at. Pull is at the right, the nut at the end of the extension. */
export function torqueFigure({ lever, extension, direction }: TorqueFigureInput, width = 640): Figure {
  const long = direction === 'longer' ? lever + extension : Math.max(lever, direction === 'shorter' ? extension : 0)
  const scale = Math.min(fit(width - 90, long), direction === 'square' ? fit(220, extension) : Infinity)
  const right = 40 + long * scale
  const drive: Point = [right - lever * scale, 90]
  const offset = extension * scale
  const nut: Point = direction === 'longer' ? [drive[0] - offset, drive[1]] : direction === 'shorter' ? [drive[0] + offset, drive[1]] : [drive[0], drive[1] + offset]
  const sketch = new Sketch('Torque with an extension', width, nut[1] + 110, scale, 'widths')
  sketch.rect('metal', drive[0] - 9, drive[1] - 7, right, drive[1] + 7)
  sketch.path('cut', direction === 'square' ? [[drive[0] - 6, drive[1]], [drive[0] + 6, drive[1]], [nut[0] + 6, nut[1]], [nut[0] - 6, nut[1]]] : [[drive[0], drive[1] - 5], [nut[0], nut[1] - 5], [nut[0], nut[1] + 5], [drive[0], drive[1] + 5]])
  sketch.circle('open', drive, 6)
  sketch.path('outline', hexagon(nut, 13))
  sketch.across(words(lever), drive, [right, drive[1]], { field: 'lever', lane: 40 })
  if (direction === 'square') sketch.down(words(extension), drive, nut, { field: 'extension', lane: drive[0] + 24 })
  else sketch.across(words(extension), [Math.min(drive[0], nut[0]), drive[1]], [Math.max(drive[0], nut[0]), drive[1]], { field: 'extension', lane: drive[1] + 36 })
  sketch.balloon(nut, 'Nut', 'the torque that counts arrives here')
  sketch.balloon(drive, 'Drive', 'where the wrench measures')
  sketch.balloon([right - 12, drive[1]], 'Grip', 'pull in the middle of the grip, square to the wrench')
  return sketch.finish()
}

function hexagon([x, y]: Point, r: number): Point[] {
  return Array.from({ length: 6 }, (_, corner) => [x + r * Math.cos((corner * Math.PI) / 3), y + r * Math.sin((corner * Math.PI) / 3)] as Point)
}
