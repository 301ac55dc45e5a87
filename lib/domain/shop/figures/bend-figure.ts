// A bend in section: inside radius, thickness, the angle it is bent through, setback to the mold point.
import type { Figure, Point } from './figure'
import { fit, Sketch, type LengthSystem } from './sketch'

export interface BendFigureInput {
  /** Inches and degrees. */
  radius: number
  thickness: number
  angle: number
}

/** Where the lying leg begins: the box for the thickness stands at its left. */
const LEFT = 124

/** `width`: pixels it will be shown at. The first leg lies, the second rises; legs are cut off. */
export function bendFigure({ radius, thickness, angle }: BendFigureInput, width = 640, system: LengthSystem = 'inch'): Figure {
  const radians = (angle * Math.PI) / 180
  const outer = radius + thickness
  const back = Math.tan(radians / 2) * outer
  const leg = Math.max(outer, 4 * thickness)
  const tall = Math.max(outer * 2, leg * Math.sin(radians) + outer) + thickness
  // A closed angle sends the mold point far away: it is drawn no further than three outer radii.
  const shownBack = Math.min(back, outer * 3)
  const [sine, cosine] = [Math.sin(radians), Math.cos(radians)]
  const reach = Math.max(shownBack, outer * (cosine < 0 ? 1 : sine) + leg * Math.max(cosine, 0))
  const scale = Math.min(fit(width - LEFT - 24, leg + reach), fit(260, tall))
  const bottom = tall * scale + 36
  const sketch = new Sketch({ title: 'Bend', system, width, height: bottom + 84, scale, byEye: back > shownBack ? 'legs; the mold point lies further out' : 'length of the legs' })
  const start = LEFT + leg * scale
  const centre: Point = [start, bottom - outer * scale]
  const on = (r: number, along = 0): Point => {
    return [centre[0] + (r * sine + along * cosine) * scale, centre[1] + (r * cosine - along * sine) * scale]
  }
  const [outEnd, inEnd, outLeg, inLeg] = [on(outer), on(radius), on(outer, leg), on(radius, leg)]
  const large = angle > 180 ? 1 : 0
  const p = ([x, y]: Point): string => `${x.toFixed(2)} ${y.toFixed(2)}`
  sketch.curve('cut', `M${LEFT} ${bottom} L${start} ${bottom} A${outer * scale} ${outer * scale} 0 ${large} 0 ${p(outEnd)} L${p(outLeg)} L${p(inLeg)} L${p(inEnd)} A${radius * scale} ${radius * scale} 0 ${large} 1 ${start} ${bottom - thickness * scale} L${LEFT} ${bottom - thickness * scale} Z`)
  sketch.line('centre', centre, on(outer * 1.05))
  sketch.line('centre', centre, [start, bottom + 8])
  sketch.line('hidden', [start, bottom], [start + shownBack * scale, bottom])
  sketch.across(sketch.decimal(back), [start, bottom], [start + shownBack * scale, bottom], { field: 'setback', lane: bottom + 26 })
  sketch.down(sketch.decimal(thickness), [LEFT, bottom - thickness * scale], [LEFT, bottom], { field: 'thickness', lane: LEFT - 12, isEntry: true, isLeft: true })
  const legTop = bottom - thickness * scale
  sketch.down(sketch.size(radius), centre, [start, bottom - thickness * scale], { field: 'radius', lane: Math.max(start - 26, LEFT), isEntry: true, isLeft: true, labelAt: Math.min((centre[1] + legTop) / 2, legTop - 24) })
  sketch.balloon([start + shownBack * scale, bottom], 'Mold point', 'where the outside faces would meet')
  sketch.balloon([start, bottom - thickness * scale], 'Bend tangent line', `from here ${sketch.length(back)} to the mold point`)
  sketch.balloon(on((radius + outer) / 2), 'Bend', `through ${Number(angle.toFixed(2))} degrees`)
  return sketch.finish()
}
