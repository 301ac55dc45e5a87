// Results of the bolt table, length first, then what is known of the bolt itself. The arithmetic is bolt-choice.ts.
import data from '@/content/shop/bolts.json'
import { boltThread, decodeBolt, type BoltLength } from './bolt-designation'
import { chooseBolt, choiceWords, shankPast, threadsPastNut } from './bolt-choice'
import { ARITHMETIC, cite, HOLE_NOTE } from './citation'
import { DRILLS } from './drill-series'
import { drillNames } from './drill-table'
import type { InputReader } from './shop-input'
import { amount, drillSize, length, lengthRange, noValue, result, thickness, words } from './shop-result'
import type { ShopResult } from './shop-table'

const lengthSource = (entry: BoltLength) => cite(data.lengths.cite, entry.printed ? undefined : 'worked')

/** Length, grip, washers and threads for the thickness, and how the neighbours would look. */
export function lengthResults(given: InputReader): ShopResult[] {
  const bolt = given.word('bolt')
  const stack = given.number('thickness') + given.number('washers') * given.number('washer')
  const { choice, longer, shorter } = chooseBolt(bolt, stack)
  const rule = [
    result('grip-rule', words('grip about equal to the thickness; a slightly longer grip is taken up with a washer'), cite(data.gripRule.cite)),
    ...data.protrusion.map(({ cite: key, threads }) => result('threads-showing-least', amount(threads, 'threads'), cite(key))),
    result('threads-in-hole-most', amount(data.threadsInHole.threads, 'threads'), cite(data.threadsInHole.cite), { note: 'and only in the thicker member' }),
  ]
  if (!choice) {
    const note = boltThread(bolt) && !shorter ? `lengths are known here for AN3 to AN6 only, not for ${bolt}` : `the table ends at ${shorter?.designation ?? bolt}, grip ${(shorter?.grip ?? 0).toFixed(3)} in`
    return [result('bolt', noValue(''), cite(data.lengths.cite), { note }), ...inHand(given, stack), ...rule]
  }
  const neighbour = (name: string, entry: BoltLength | null): ShopResult[] => entry ? [result(name, words(`${entry.designation}: ${choiceWords(bolt, entry, stack)}`), ARITHMETIC)] : []
  return [
    result('bolt', words(choice.designation), lengthSource(choice), { how: `stack with washers ${stack.toFixed(3)}`, note: 'A at the end: shank not drilled; the plans name the bolt' }),
    result('length', length(choice.length), lengthSource(choice)), result('grip', length(choice.grip), lengthSource(choice)),
    result('shank-past', thickness(shankPast(choice, stack)), ARITHMETIC, { how: 'grip less stack', note: choiceWords(bolt, choice, stack) }),
    showing(given, bolt, choice, stack), ...neighbour('one-shorter', shorter), ...neighbour('one-longer', longer), ...inHand(given, stack), ...rule,
  ]
}

function showing(given: InputReader, bolt: string, entry: BoltLength, stack: number): ShopResult {
  const nut = given.optionalNumber('nut')
  if (nut === undefined) return result('threads-showing', noValue('threads'), ARITHMETIC, { note: 'give the height of the nut in hand' })
  const threads = threadsPastNut(bolt, entry, stack, nut)
  const note = threads < 0 ? 'the end of the bolt is inside the nut: too short' : threads < 1 ? 'under one thread: too short' : threads < 2 ? 'one thread is enough for the AC, two for the Navy' : undefined
  return result('threads-showing', amount(threads, 'threads', 1), ARITHMETIC, { how: 'length - stack - nut, times threads per inch', note: [note, 'the chamfered end counts as no thread'].filter(Boolean).join('; ') })
}

function inHand(given: InputReader, stack: number): ShopResult[] {
  const decoded = decodeBolt(given.optionalWord('part') ?? '')
  if (!decoded) return []
  const holes = `${decoded.headDrilled ? 'head drilled' : 'head not drilled'}, ${decoded.shankDrilled ? 'shank drilled' : 'shank not drilled'}`
  return [
    result('in-hand', words(choiceWords(decoded.bolt, decoded, stack)), ARITHMETIC),
    result('part', words(`${decoded.bolt}, ${decoded.material}, ${holes}`), cite(data.code.cite)),
    result('part-length', length(decoded.length), lengthSource(decoded)), result('part-grip', length(decoded.grip), lengthSource(decoded)),
  ]
}

/** Thread, holes, marks: what doesn't hang on the thickness. */
export function boltFacts(bolt: string): ShopResult[] {
  const thread = boltThread(bolt)
  const army = data.holes.rows.find((row) => row.bolt === bolt)
  return [
    ...(thread ? [result('thread', words(`${thread.nominal} in, ${thread.thread}`), cite(data.threads.cite), { note: bolt === data.inch16.bolt && data.inch16.note })] : []),
    army ? result('hole', lengthRange(army.min, army.max), cite(data.holes.cite), { note: HOLE_NOTE }) : result('hole', noValue('in'), cite(data.holes.cite), { note: `the table ends at AN6: no value for ${bolt}` }),
    clearanceHole(bolt),
    ...(bolt === data.driveFit.bolt ? [result('drive-fit', { ...thickness(data.driveFit.interference), display: { inch: '0.0006 in', metric: '0.015 mm' } }, cite(data.driveFit.cite), { how: 'reamed hole, 5/8 in bolt' })] : []),
    ...data.marks.rows.map(({ material, mark }) => result('head-mark', words(`${material}: ${mark}`), cite(data.marks.cite))),
    result('least-primary', words(`steel ${data.leastPrimary.steel}, aluminium alloy ${data.leastPrimary.aluminium}`), cite(data.leastPrimary.cite)),
  ]
}

/** AC para 7-39: the first lettered drill larger than the bolt. Letters begin far above a 3/16 bolt and end at 0.413. */
export function clearanceHole(bolt: string): ShopResult {
  const inches = boltThread(bolt)?.inches ?? 0
  const letter = DRILLS.find((drill) => drill.series === 'letter' && drill.inches > inches + 1e-9)
  const first = DRILLS.find((drill) => drill.series === 'letter')
  if (!letter) return result('clearance-hole', noValue('in'), cite(data.clearance.cite), { note: 'letter drills end at Z, 0.413 in' })
  if (letter === first) return result('clearance-hole', noValue('in'), cite(data.clearance.cite), { note: `letter drills begin at A, 0.234 in: the rule gives no fit for ${bolt}` })
  return result('clearance-hole', drillSize(letter, drillNames(letter)), cite(data.clearance.cite, 'worked'), { how: 'first lettered drill larger than the bolt', note: HOLE_NOTE })
}

