// Which figures a table's answer is drawn with, from its inputs and results. How each is drawn is the file named after it.
import { chooseBolt } from '../bolt-choice'
import { boltThread } from '../bolt-designation'
import { flushHead } from '../countersink-table'
import { drillNames } from '../drill-table'
import { drillsOf, nearestDrill, nextDrill, type Drill } from '../drill-series'
import { inchesOf } from '../exact-fraction'
import { shopHead, finalHoles } from '../rivet-rules'
import { InputReader, type ShopInputs } from '../shop-input'
import type { ShopResult } from '../shop-table'
import { tubeDiameter } from '../tube-table'
import { unitLength } from '../units-table'
import { bendFigure } from './bend-figure'
import { boltFigure } from './bolt-figure'
import { countersinkFigure } from './countersink-figure'
import { drillFigure } from './drill-figure'
import { edgeFigure } from './edge-figure'
import type { Figure } from './figure'
import { grommetFigure } from './grommet-figure'
import { lengthFigure } from './length-figure'
import { rivetFigure } from './rivet-figure'
import type { LengthSystem } from './sketch'
import { torqueFigure } from './torque-figure'
import { tubeFigure } from './tube-figure'
import { wireFigure } from './wire-figure'

interface Answered {
  given: InputReader
  /** The first number of the results of this name, or its least. */
  found: (name: string) => number | undefined
  width: number
  system: LengthSystem
}

const drawings: Readonly<Record<string, (answered: Answered) => (Figure | null)[]>> = {
  drills: (answered) => [drills(answered)],
  rivet: (answered) => [rivet(answered), edge(answered)],
  'countersink-or-dimple': (answered) => [countersink(answered)],
  bolt: (answered) => [bolt(answered)],
  torque: (answered) => [torque(answered)],
  grommet: (answered) => [grommet(answered)],
  bend: ({ given, width, system }) => [bendFigure({ radius: given.number('radius'), thickness: given.number('thickness'), angle: given.number('angle') }, width, system)],
  tube: (answered) => [tube(answered)],
  wire: ({ given, found, width, system }) => [wireFigure({ bundle: given.optionalNumber('bundle') ?? 0.5, clearance: given.optionalNumber('clearance') ?? found('clearance') ?? 0.375, leastClearance: found('clearance') ?? 0.375 }, width, system)],
  units: (answered) => [units(answered)],
}

/**
 * The figures of an answer, each `width` pixels wide; none where the table has no value to draw. What the reader has not given and
 * the figure needs is drawn at the least that is allowed, or by eye.
 */
export function tableFigures(table: string, inputs: ShopInputs, results: readonly ShopResult[], width: number, system: LengthSystem = 'inch'): Figure[] {
  const draw = Object.hasOwn(drawings, table) ? drawings[table] : undefined
  const found = (name: string): number | undefined => {
    const value = results.find((result) => result.name === name && (result.value.number ?? result.value.min) !== undefined)?.value
    return value?.number ?? value?.min
  }
  return numberedOn((draw?.({ given: new InputReader(inputs), found, width, system }) ?? []).filter((figure) => figure !== null))
}

/** Balloons count on from figure to figure: a number means one thing on a page. */
function numberedOn(figures: readonly Figure[]): Figure[] {
  let before = 0
  return figures.map((figure) => {
    const balloons = figure.balloons.map((balloon) => ({ ...balloon, n: balloon.n + before }))
    before += balloons.length
    return { ...figure, balloons }
  })
}

const named = (drill: Drill | null | undefined) => (drill ? { name: drillNames(drill), inches: drill.inches } : null)

function drills({ given, width, system }: Answered): Figure {
  const inches = given.number('size')
  const [exact] = drillsOf(inches)
  const size = named(exact) ?? { name: nearestDrill(inches) ? 'no drill' : 'size', inches }
  return drillFigure({ size, below: named(nextDrill(inches, -1)), above: named(nextDrill(inches, 1)) }, width, system)
}

function rivet({ given, found, width, system }: Answered): Figure | null {
  const [size, stack, hole, length] = [given.word('diameter'), given.number('stack'), found('hole'), found('rivet')]
  if (given.word('head') === 'blind' || hole === undefined || length === undefined) return null
  const diameter = inchesOf(size)
  const { width: headWidth, height: headHeight } = shopHead(diameter, given.word('alloy'))
  const thickest = given.optionalNumber('sheet')
  const sheets = thickest !== undefined && thickest < stack ? [stack - thickest, thickest] : [stack / 2, stack / 2]
  const drill = finalHoles(size)[0]?.drill
  return rivetFigure({ diameter, ...(drill ? { holeName: drillNames(drill) } : {}), hole, sheets, length, headWidth, headHeight, flush: given.word('head') === 'flush' }, width, system)
}

function edge({ given, found, width, system }: Answered): Figure | null {
  const [leastEdge, leastPitch] = [found('edge-centre'), found('pitch-least')]
  if (leastEdge === undefined || leastPitch === undefined) return null
  const diameter = inchesOf(given.word('diameter'))
  return edgeFigure({
    hole: found('hole') ?? diameter, headWidth: diameter * 2, leastEdge, leastPitch,
    edge: given.optionalNumber('edge') ?? leastEdge, pitch: given.optionalNumber('pitch') ?? found('pitch-usual') ?? leastPitch,
  }, width, system)
}

function countersink({ given, width, system }: Answered): Figure | null {
  const size = given.word('diameter')
  const head = flushHead(size)
  return head ? countersinkFigure({ sheet: given.number('sheet'), hole: finalHoles(size)[0]?.drill.inches ?? inchesOf(size), headDiameter: head.headDiameter, headHeight: head.headHeight }, width, system) : null
}

function bolt({ given, width, system }: Answered): Figure | null {
  const [size, thickness, washers, washer, nut] = [given.word('bolt'), given.number('thickness'), given.number('washers'), given.number('washer'), given.optionalNumber('nut')]
  const { choice } = chooseBolt(size, thickness + washers * washer)
  const diameter = boltThread(size)?.inches
  return choice && diameter !== undefined ? boltFigure({ diameter, grip: choice.grip, length: choice.length, thickness, washers, washer, ...(nut === undefined ? {} : { nut }) }, width, system) : null
}

function torque({ given, width, system }: Answered): Figure {
  const direction = given.word('direction')
  const lever = given.optionalNumber('lever')
  const extension = given.optionalNumber('extension')
  return torqueFigure({ lever, extension, direction: direction === 'shorter' || direction === 'square' ? direction : 'longer' }, width, system)
}

function grommet({ given, found, width, system }: Answered): Figure | null {
  const groove = given.optionalNumber('groove')
  const hole = groove ?? found('hole')
  const bore = found('bore') ?? given.number('bore')
  // A hole that is there takes another grommet than the bore asked for: drawing that one beside it would show a wrong fit.
  const there = given.optionalNumber('hole')
  if (there !== undefined && groove === undefined && hole !== undefined && Math.abs(there - hole) > 1e-6) return null
  return hole !== undefined && hole > bore ? grommetFigure({ bore, hole }, width, system) : null
}

function tube({ given, found, width, system }: Answered): Figure | null {
  const outside = tubeDiameter(-Number(given.word('size')))
  const radius = found('bend-radius') ?? found('hose-bend-radius')
  const wall = given.optionalNumber('wall')
  return radius === undefined ? null : tubeFigure({ outside, radius, flattened: outside * 0.75, ...(wall === undefined ? {} : { wall }) }, width, system)
}

function units({ given, width }: Answered): Figure | null {
  const inches = unitLength(given.word('value'), given.word('from'))
  return inches === null ? null : lengthFigure({ inches }, width)
}
