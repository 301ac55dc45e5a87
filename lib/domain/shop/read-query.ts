// What a search for a number asks of the shop tables: table and inputs by the words, parts and measurements of the query. Pure.
import type { Measurement } from '@/lib/domain/measurements/measurement'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { BOLTS, boltThread } from './bolt-designation'
import { SCREWS, smallestDrillFor } from './screw-clearance'

export interface ShopReading {
  table: string
  inputs: Record<string, string>
  /** What was understood: 'a grommet with a 3/8 bore'. */
  label: string
}

/**
 * The readings of a query, the likeliest first; none when it asks for no number of a table. Nothing is guessed: without a size or
 * a part there is no reading.
 */
export function readShopQuery(text: string): ShopReading[] {
  const query = text.slice(0, 300)
  const words = new Set(query.toLowerCase().match(/[a-z]+/g) ?? [])
  const found = findMeasurements(query)
  return [...grommets(query, words, found), ...torques(query, words), ...rivets(words, found), ...bolts(query, words), ...screws(query, words), ...drills(words, found)]
}

const has = (words: ReadonlySet<string>, ...any: string[]) => any.some((word) => words.has(word))
const sizeOf = (m: Measurement): string => (m.kind === 'drill' ? String(m.inches ?? m.value) : m.unit === 'in' ? (m.exact ?? String(m.value)) : `${m.value} ${m.unit}`)
const aSize = (found: readonly Measurement[]) => found.find((m) => m.kind === 'length' || m.kind === 'drill')

function grommets(query: string, words: ReadonlySet<string>, found: readonly Measurement[]): ShopReading[] {
  const part = /\b(?:an931|ms35489)-\d{1,3}(?:-\d{1,3})?\b/i.exec(query)?.[0]
  if (part) return [{ table: 'grommet', inputs: { part: part.toUpperCase() }, label: `the grommet ${part.toUpperCase()}` }]
  const size = aSize(found)
  if (!size || !has(words, 'grommet', 'grommets')) return []
  const inches = sizeOf(size)
  const through = has(words, 'tube', 'tubing', 'conduit', 'line', 'hose', 'cable', 'bundle') ? [{ table: 'grommet', inputs: { bore: inches, through: inches }, label: `a grommet for ${inches} tube or conduit` }] : []
  return [
    ...through,
    { table: 'grommet', inputs: { bore: inches }, label: `a grommet with a ${inches} bore` },
    { table: 'grommet', inputs: { hole: inches }, label: `a ${inches} hole that takes a grommet` },
  ]
}

function torques(query: string, words: ReadonlySet<string>): ShopReading[] {
  if (!has(words, 'torque', 'torques', 'tighten', 'tight')) return []
  const bolt = boltIn(query)
  const thread = bolt ? boltThread(bolt)?.thread : /\b(?:8-36|10-32|1\/4-28|5\/16-24|3\/8-24|7\/16-20|1\/2-20)\b/.exec(query)?.[0]
  return thread ? [{ table: 'torque', inputs: { thread }, label: bolt ? `the nut of an ${bolt} bolt, thread ${thread}` : `a nut on a ${thread} thread` }] : []
}

const rivetSizes = ['3/32', '1/8', '5/32', '3/16', '1/4']

function rivets(words: ReadonlySet<string>, found: readonly Measurement[]): ShopReading[] {
  const designation = found.find((m) => m.kind === 'rivet')
  if (!designation && !has(words, 'rivet', 'rivets')) return []
  const inches = designation?.diameter ?? found.find((m) => m.kind === 'length')?.inches
  const diameter = rivetSizes.find((size) => { const [n = 0, d = 1] = size.split('/').map(Number); return inches !== undefined && Math.abs(n / d - inches) < 0.002 })
  if (!diameter) return []
  const isFlush = has(words, 'flush', 'countersunk') || /(?:426|1097)/.test(designation?.raw ?? '')
  const said = isFlush ? 'flush' : has(words, 'pop', 'pull', 'blind') ? 'blind' : designation || has(words, 'universal', 'solid') ? 'universal' : null
  // A rivet whose head nobody named is most often a solid one, but a flush or a blind one is a tap away.
  return (said ? [said] : ['universal', 'flush', 'blind']).map((head) => ({ table: 'rivet', inputs: { diameter, head }, label: `a ${head === 'universal' ? 'solid' : head} rivet of ${diameter} in` }))
}

function bolts(query: string, words: ReadonlySet<string>): ShopReading[] {
  if (has(words, 'torque', 'torques')) return []
  const bolt = boltIn(query)
  const part = /\ban\d{1,2}h?-\d{1,3}a?\b/i.exec(query)?.[0]
  if (!bolt || (!part && !has(words, 'bolt', 'bolts', 'grip', 'length'))) return []
  return [{ table: 'bolt', inputs: { bolt, ...(part ? { part: part.toUpperCase() } : {}) }, label: part ? `the bolt ${part.toUpperCase()}` : `an ${bolt} bolt` }]
}

/** A hole for a numbered screw; "10-32" is its thread. Not a tapped hole: no table here gives tap drills. */
function screws(query: string, words: ReadonlySet<string>): ShopReading[] {
  if (!has(words, 'screw', 'screws') || !has(words, 'hole', 'holes', 'drill', 'clearance') || has(words, 'tap', 'tapped', 'torque')) return []
  // A screw's number stands behind its sign or right before the word: other numbers are how many, millimetres, a step.
  const said = /(?<![\w./-])(?:#|no\.? ?|number )(\d{1,2})(?:-\d{2})?(?![\w/.])/i.exec(query) ?? /(?<![\w./-]|\bsteps? |\bpages? )(\d{1,2})(?:-\d{2})? screws?\b/i.exec(query)
  const size = Number(said?.[1])
  const drill = SCREWS.some((known) => known === size) ? smallestDrillFor(size) : null
  return drill ? [{ table: 'drills', inputs: { screw: `#${size}`, size: drill.name }, label: `a hole that passes a #${size} screw` }] : []
}

function drills(words: ReadonlySet<string>, found: readonly Measurement[]): ShopReading[] {
  if (has(words, 'rivet', 'rivets', 'grommet', 'grommets', 'torque')) return []
  const drill = found.find((m) => m.kind === 'drill') ?? (has(words, 'drill', 'bit') ? aSize(found) : undefined)
  if (!drill) return []
  const size = drill.kind === 'drill' ? (drill.exact ?? sizeOf(drill)) : sizeOf(drill)
  return [{ table: 'drills', inputs: { size }, label: `the drill ${size}` }]
}

/** A bolt by its dash-less designation, such as AN3, when the tables know it. */
function boltIn(query: string): string | null {
  const named = /\ban ?(\d{1,2})(?!\d)/i.exec(query)?.[1]
  return BOLTS.find((bolt) => bolt === `AN${named}`) ?? null
}
