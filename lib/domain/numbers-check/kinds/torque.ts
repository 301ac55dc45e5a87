// Torque of bolts and nuts (AC 43.13-1B table 7-1) and of flared tube nuts. What no table lists has no value; nothing is extrapolated.
import torqueData from '@/content/shop/torque.json'
import bolts from '@/content/shop/bolts.json'
import { cite } from '../../shop/citation'
import { boltTorque, prevailingTorque, threadDiameter, TORQUE_THREADS, type NutKind } from '../../shop/torque-rules'
import { tubeNutTorque, type TubeJoint } from '../../shop/tube-table'
import { finding, judge, type Allowed, type Finding } from '../judge'
import type { Mark } from '../marks'
import { boundAt, claims, hasAny, type Statement } from '../statement'
import { paired, spanOf, type Subject } from '../subjects'
import type { Kind, Scene } from './kind'
import { tubesOf } from './tube'

export const torque: Kind = (scene) => {
  const { statement } = scene
  const values = claims(statement).filter((mark) => mark.what === 'torque' && mark.low > 0)
  if (values.length === 0) return []
  const tubes = tubesOf(statement)
  const isTube = tubes.length > 0 && (hasAny(statement, 'flare', 'flared', 'fitting', 'fittings', 'b-nut', 'hose', 'tube', 'tubing', 'line') || tubes.some(({ mark }) => mark.name === 'nut'))
  if (isTube) return paired(statement, values, tubes).map(({ value, subject }) => tubeTorque(scene, value, subject))
  const own = scene.subjects.filter(({ kind, mark }) => kind !== 'rivet' && !(mark?.what === 'length' && isOtherBolt(statement)))
  const subjects = own.length > 0 ? own : scene.carried.bolt && !isOtherBolt(statement) && scene.subjects.length === 0 ? [scene.carried.bolt] : []
  if (subjects.length === 0) return isOtherBolt(statement) ? values.map((value) => finding([value], 'cannot-tell', 'torque')) : []
  return paired(statement, withoutConversions(statement, values), subjects).map(({ value, subject }) => boltTorqueOf(scene, value, subject))
}

/** The engine's, the propeller's and the wheel's bolts are their makers' affair. */
const isOtherBolt = (statement: Statement): boolean => hasAny(statement, 'prop', 'propeller', 'spark', 'plug', 'plugs', 'cylinder', 'cylinders', 'crankcase', 'wheel', 'wheels', 'brake', 'drain', 'filter', 'axle', 'clamp', 'clamps', 'jam', 'spinner', 'magneto', 'rod', 'sump', 'caliper')

/** "25 in-lb (2.8 N·m)": the second says the first again. */
function withoutConversions(statement: Statement, values: readonly Mark[]): Mark[] {
  return values.filter((value, index) => {
    const previous = values[index - 1]
    return !previous || previous.unit === value.unit || Math.abs(previous.low - value.low) > value.low * 0.06 + value.step
  })
}

function nutOf(statement: Statement): NutKind | undefined {
  const named = statement.marks.filter(({ what, name }) => what === 'nut' && name !== '').map(({ name }) => name)
  const shear = named.includes('shear') || hasAny(statement, 'shear', 'thin', 'half')
  const tension = named.includes('tension') || hasAny(statement, 'tension', 'full', 'plain', 'tall')
  return shear === tension ? undefined : shear ? 'shear' : 'tension'
}

/** Threads a subject may have: a plain "1/4 bolt" is fine or coarse. */
function threadsOf(subject: Subject): string[] {
  const bolt = bolts.threads.rows.find((row) => row.bolt === subject.name)
  if (bolt) return [bolt.thread]
  if (subject.name.includes('-') && TORQUE_THREADS.includes(subject.name)) return [subject.name]
  return TORQUE_THREADS.filter((thread) => subject.mark?.what !== 'thread' && Math.abs(threadDiameter(thread) - subject.inches) < 0.001)
}

const inchPounds = (low: number, high: number): string => `${low}-${high} in-lb`

function boltTorqueOf({ statement, limits }: Scene, value: Mark, subject: Subject): Finding {
  const marks = spanOf(subject, value)
  const threads = threadsOf(subject)
  if (hasAny(statement, 'prevailing', 'drag', 'friction', 'running', 'run-on', 'breakaway')) return prevailing(marks, threads, value, statement)
  const nut = nutOf(statement)
  const kinds: readonly NutKind[] = nut ? [nut] : ['tension', 'shear']
  const bound = boundAt(statement, value)
  const found = threads.flatMap((thread) => kinds.flatMap((kind) => {
    const range = boltTorque(thread, kind)
    return range ? [{ ...range, words: `${inchPounds(range.min, range.max)} (${thread}, ${kind} nut)` }] : []
  }))
  const allowed: Allowed[] = found.map(({ min, max, most, words }) =>
    bound === 'most' ? { low: max, high: most, expected: `${words}, at most ${most}`, citation: cite(torqueData.table.cite) } : { low: min, high: max, expected: words, citation: cite(torqueData.table.cite) })
  const top = Math.max(...found.map(({ most }) => most))
  const wet = hasAny(statement, 'oiled', 'lubricated', 'lubed', 'greased', 'anti-seize', 'antiseize', 'wet', 'drag')
  const slack = Math.max(value.low * 0.005, value.unit === 'in-lb' ? 0.1 : Math.min(value.step / 2, value.low * 0.04))
  // Up to the table's maximum a bolt may be turned to line up its cotter hole.
  const doubtful = (wet && value.high <= top) || (bound === 'most' && value.high < top) || (hasAny(statement, 'cotter', 'castle', 'castellated') && value.high <= top)
  return judge({ marks, low: value.low, high: value.high, slack, table: 'torque', result: 'torque', size: subject.inches, ...(nut ? { said: { nut } } : {}) }, allowed, limits, doubtful)
}

function prevailing(marks: readonly Mark[], threads: readonly string[], value: Mark, statement: Statement): Finding {
  const lists = threads.flatMap(prevailingTorque)
  if (lists.length === 0 || boundAt(statement, value) === 'most') return finding(marks, 'cannot-tell', 'torque')
  const allowed: Allowed[] = lists.map(({ cite: key, least }) => ({ low: least, high: least, expected: `at least ${least} in-lb`, citation: cite(key) }))
  const lowest = Math.min(...lists.map(({ least }) => least))
  return judge({ marks, low: value.low, high: value.high, slack: 0.3, table: 'torque', result: 'prevailing' }, allowed, [], value.low >= lowest)
}

function tubeTorque({ statement, limits }: Scene, value: Mark, tube: { mark: Mark; size: number }): Finding {
  const joints: TubeJoint[] = hasAny(statement, 'steel', 'stainless') ? ['steel'] : hasAny(statement, 'aluminum', 'aluminium', 'soft', '5052') ? ['aluminium'] : hasAny(statement, 'hose', 'hoses') ? ['hose'] : ['aluminium', 'steel']
  const allowed: Allowed[] = joints.flatMap((joint) => tubeNutTorque(tube.size, joint).map(({ cite: key, min, max }) => ({ low: min, high: max, expected: `${inchPounds(min, max)} (-${tube.size}, ${joint})`, citation: cite(key) })))
  const slack = value.unit === 'in-lb' ? 0.1 : Math.min(value.step / 2, value.low * 0.04)
  return judge({ marks: [tube.mark, value], low: value.low, high: value.high, slack, table: 'tube', result: 'torque', size: tube.size / 16, ...(joints.length === 1 && joints[0] ? { said: { joint: joints[0] } } : {}) }, allowed, limits)
}
