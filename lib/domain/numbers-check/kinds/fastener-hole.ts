// Holes for rivets, screws and bolts. A pilot is only asked not to be larger than the hole itself; tap drills no table here gives.
import bolts from '@/content/shop/bolts.json'
import { clearanceHole } from '../../shop/bolt-results'
import { cite, COMMON_PRACTICE, type Citation } from '../../shop/citation'
import { DRILLS } from '../../shop/drill-series'
import { blindHole, finalHoles, RIVET_DIAMETERS } from '../../shop/rivet-rules'
import { SCREW_SOURCE } from '../../shop/screw-clearance'
import { finding, judge, type Allowed, type Claim, type Finding } from '../judge'
import type { Mark } from '../marks'
import { before, behind, between, claims, dimensionOf, hasAny, leadOf, nounOf, type Statement } from '../statement'
import { isBlind, paired, spanOf, type Subject } from '../subjects'
import type { Kind, Scene } from './kind'

export const fastenerHole: Kind = (scene) => {
  const { statement } = scene
  const holes = finalHolesOf(statement, scene.subjects)
  if (holes.length === 0) return []
  const subjects = scene.subjects.length > 0 ? scene.subjects : carriedSubjects(scene)
  return paired(statement, holes, subjects).filter(({ value, subject }) => areLinked(statement, value, subject)).flatMap(({ value, subject }) => judged(scene, value, subject))
}

const removing = /\bdrill(?:ed|ing)? (?:\S+ ){0,4}out\b|\bremov(?:e|es|ed|ing|al)\b|\btooling\b/
const linking = /\b(?:for|in|into|through|takes?|needs?|gets?|wants?|suits?|fits?|passes|pass|clears?|to|means?|at|with|is|are|use|holes?)\b|[:,]/

/**
 * Whether a hole is the one of this fastener. A size far from the fastener's needs a link close by ("a 1/4 drill for 5/32 rivets");
 * a hole that is for something else has none.
 */
function areLinked(statement: Statement, hole: Mark, { mark, inches, kind }: Subject): boolean {
  if (kind === 'rivet' && removing.test(statement.text)) return false
  if (!mark) return true
  const gap = hole.start < mark.start ? between(statement, hole, mark) : between(statement, mark, hole)
  const isNear = gap.length <= 32 && linking.test(gap) && !/\b(?:then|first|before|after|end|corner)\b/.test(gap)
  const isElsewhere = /^\W*(?:in\.? |inch )?(?:holes? |drill |bit )?for (?:the |a |an |your )?(?!\w*\s*rivets?|final|this|that|it|them|these|those)[a-z]{3,}/.test(behind(statement, hole)) && hole.start > mark.start
  const ratio = hole.low / inches
  return isNear || (!isElsewhere && (hole.what === 'drill' || (ratio > 0.75 && ratio < 1.35)) && gap.length <= 90)
}

/** A bare "use #30" is about what was spoken of before, if nothing else can be meant. */
function carriedSubjects({ statement, carried }: Scene): Subject[] {
  const other = hasAny(statement, 'screw', 'screws', 'bolt', 'bolts', 'wire', 'wires', 'grommet', 'tube', 'hinge', 'nutplate', 'nutplates', 'for', 'pin', 'is', 'are', 'crack', 'drain', 'pilot', 'tap')
  const drills = statement.marks.filter(({ what }) => what === 'drill')
  return carried.rivet && !other && drills.length > 0 && statement.marks.length === drills.length ? [carried.rivet] : []
}

const holeVerb = /\b(?:drill|ream|open|bore|bit|hole|holes|enlarge|step|drilled|reamed|opened|final|go|punch)\b[^,;:]{0,40}\b(?:to|at|with|of|a|an|is|are|:)\s*(?:a |an |the |about |at )?$/

function isHole(statement: Statement, mark: Mark): boolean {
  if (mark.standing === 'subject' || dimensionOf(statement, mark) !== '') return false
  const noun = nounOf(statement, mark)
  if (mark.what === 'drill') return noun !== 'screw'
  if (mark.what !== 'length') return false
  if (noun === 'hole' || noun === 'drill') return true
  return noun === '' && (needsIt(statement, mark) || leadOf(statement, mark) === 'hole' || leadOf(statement, mark) === 'drill' || holeVerb.test(before(statement, mark)) || isBareVerb(statement, mark))
}

/** "A #10 screw needs at least 0.190". */
const needsIt = (statement: Statement, mark: Mark): boolean => /\b(?:screws?|bolts?|rivets?|\d) (?:needs?|wants?|takes?|goes in(?:to)?|go in(?:to)?|passes|pass|clears|fits?)(?: through| into| in)?(?: at least| about)?(?: an?)? $/.test(before(statement, mark))
  && /^\W*(?:$|in\b|for\b|clear|\.)/.test(behind(statement, mark)) && !hasAny(statement, 'edge', 'torque', 'grip', 'apart', 'long')

/** "Drill 0.098", "drill the flange 0.098". */
const isBareVerb = (statement: Statement, mark: Mark): boolean => /\b(?:drill|ream|bore)(?: (?:the|them|it|all|those|these|final|out|each) ?[a-z]*| [a-z]+)? $/.test(before(statement, mark)) && /^ (?:for|to|in|if|when|and|$)|^$|^\W/.test(behind(statement, mark))

/** Holes that are claimed: without pilots, without a size that is only said again in brackets. */
function finalHolesOf(statement: Statement, subjects: readonly Subject[]): Mark[] {
  const taken = new Set(subjects.flatMap(({ mark }) => (mark ? [mark] : [])))
  const holes = claims(statement).filter((mark) => !taken.has(mark) && isHole(statement, mark))
  return holes.filter((mark, index) => {
    const [previous, next] = [holes[index - 1], holes[index + 1]]
    if (previous && /^\W*\($|^\s*[(=]\s*$|^,? (?:which is|that is|i\.e\.|is|or) $/.test(between(statement, previous, mark)) && Math.abs(previous.low - mark.low) < 0.004) return false
    return !isPilot(statement, mark, next)
  })
}

function isPilot(statement: Statement, mark: Mark, next: Mark | undefined): boolean {
  if (/\b(?:pilot(?:s|ed)?|starter|undersize|start(?:s|ed)?|starting|from|first)\b(?: [a-z]+){0,2}\W*$|\bstart (?:\S+ ){0,5}$/.test(before(statement, mark).slice(-40)) || /^\W*(?:pilot|pilots|undersize|first|to start|oversize)\b/.test(behind(statement, mark))) return true
  return next !== undefined && next.low > mark.low && /\b(?:then|to|before|and open|up|followed|final|finish)\b/.test(between(statement, mark, next))
}

function judged(scene: Scene, hole: Mark, subject: Subject): Finding[] {
  switch (subject.kind) {
    case 'rivet': return [rivetHole(scene, hole, subject)]
    case 'screw': return screwHole(scene, hole, subject)
    case 'bolt': return boltHole(scene, hole, subject)
  }
}

const drillWords = (name: string, inches: number): string => `${name} · ${inches.toFixed(4)} in`
/** A drill is what it is; a written size may be rounded. */
const slackOf = (hole: Mark): number => Math.max(hole.what === 'drill' ? 0.0002 : 0.0007, hole.step / 2)

/** What the sources allow for each stock size, solid and blind. */
const holesBySize = new Map(RIVET_DIAMETERS.map((size) => [size, listedHoles(size)]))

function listedHoles(size: string): { solid: Allowed[]; chart: Allowed[] } {
  const blind = blindHole(size)
  const chart: Allowed[] = blind ? [{ low: blind.min, high: blind.max, expected: `${blind.drill}, ${blind.min.toFixed(3)} to ${blind.max.toFixed(3)} in (blind rivet)`, citation: cite('hole-blind') }] : []
  const solid: Allowed[] = finalHoles(size).map(({ cite: key, drill }) => ({ low: drill.inches, high: drill.inches, expected: drillWords(drill.name, drill.inches), citation: cite(key) }))
  return { solid, chart }
}

function rivetHole({ statement, limits }: Scene, hole: Mark, subject: Subject): Finding {
  const { solid, chart } = holesBySize.get(subject.name) ?? { solid: [], chart: [] }
  const claim: Claim = { marks: spanOf(subject, hole), low: hole.low, high: hole.high, slack: slackOf(hole), table: 'rivet', result: 'hole', size: subject.inches }
  if (isBlind(statement)) return judge(claim, chart, limits)
  const listed = [...solid, ...chart].map(({ low }) => low)
  const isBetween = listed.length > 0 && hole.low >= Math.min(...listed) - 0.0005 && hole.high <= Math.max(...listed) + (hole.what === 'drill' ? 0.0005 : 0.0025)
  // A rivet that isn't said to be solid may be a blind one, whose hole is a little larger.
  // A temporary fastener holds in a smaller hole than the rivet's.
  return judge(claim, solid, limits, isBetween || (hasAny(statement, 'cleco', 'clecos', 'clecoes') && hole.low < subject.inches))
}

/** Clearance charts go no further beyond a numbered screw: a loose fit. */
const looseFit = 0.033
const closeFit = 0.0145

function screwHole({ statement, limits }: Scene, hole: Mark, subject: Subject): Finding[] {
  const marks = spanOf(subject, hole)
  const words = `at least ${subject.inches.toFixed(3)} in, the screw's own diameter`
  if (hasAny(statement, 'tap', 'tapping', 'tapped', 'taps', 'thread', 'threads', 'threaded', 'dimple', 'countersink', 'countersunk')) return [finding(marks, 'cannot-tell', 'drill')]
  const passes = hasAny(statement, 'pass', 'passes', 'clear', 'clears', 'clearance', 'loose', 'free', 'room', 'through', 'slides', 'slide', 'least', 'minimum')
  const screw: Citation = { source: SCREW_SOURCE, basis: SCREW_SOURCE.basis, notes: [] }
  const claim: Claim = { marks, low: hole.low, high: hole.high, slack: hole.step / 2, table: 'drill', result: 'clearance', size: subject.inches }
  const high = passes ? Infinity : subject.inches + closeFit
  return [judge(claim, [{ low: subject.inches, high, expected: words, citation: screw }], limits, hole.low >= subject.inches && hole.high < subject.inches + looseFit)]
}

function boltHole({ statement, limits }: Scene, hole: Mark, subject: Subject): Finding[] {
  if (hasAny(statement, 'tap', 'tapping', 'tapped', 'cotter', 'safety')) return []
  const bolt = bolts.threads.rows.find((row) => row.bolt === subject.name || row.thread === subject.name || row.nominal === subject.name)?.bolt ?? ''
  const army = bolts.holes.rows.find((row) => row.bolt === bolt)
  const letter = bolt ? clearanceHole(bolt).value : {}
  const drill = DRILLS.find(({ inches }) => inches === letter.number)
  const marks = spanOf(subject, hole)
  const allowed: Allowed[] = [
    ...(army ? [{ low: army.min, high: army.max, expected: `${army.min} to ${army.max} in`, citation: cite('bolt-hole') }] : []),
    ...(drill ? [{ low: drill.inches, high: drill.inches, expected: drillWords(drill.name, drill.inches), citation: cite('bolt-fit', 'worked') }] : []),
  ]
  const claim: Claim = { marks, low: hole.low, high: hole.high, slack: Math.max(0.0003, hole.step / 2), table: 'bolt', result: 'hole', size: subject.inches }
  const largest = Math.max(...allowed.map(({ high }) => high))
  const least: Allowed = { low: subject.inches, high: Infinity, expected: `at least ${subject.inches.toFixed(4)} in, the bolt's own diameter`, citation: COMMON_PRACTICE }
  // Without a listed fit only a hole the bolt cannot enter is wrong.
  if (allowed.length === 0) return hole.high < subject.inches - 1e-4 ? [judge(claim, [least], limits)] : [finding(marks, 'cannot-tell', 'bolt')]
  const passes = hasAny(statement, 'pass', 'passes', 'clear', 'clears', 'clearance', 'loose')
  return [judge(claim, allowed, limits, hole.low >= subject.inches - 1e-4 && hole.high <= (passes ? subject.inches * 1.2 : largest + 0.004))]
}
