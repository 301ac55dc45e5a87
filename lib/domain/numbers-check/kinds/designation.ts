// What a part number means: diameter and length of rivets and bolts, their heads, alloys and threads, the unit of a dash.
import bolts from '@/content/shop/bolts.json'
import { cite, COMMON_PRACTICE } from '../../shop/citation'
import { length } from '../../shop/shop-result'
import { machineScrewDiameter, SCREW_SOURCE } from '../../shop/screw-clearance'
import { finding, judge, type Finding } from '../judge'
import type { Mark } from '../marks'
import { behind, between, claims, dimensionOf, hasAny, nounOf, placeOf, type Statement } from '../statement'
import { boltOf } from './bolt-length'
import type { Kind } from './kind'

export const designation: Kind = ({ statement }) => statement.marks.flatMap((mark): Finding[] => {
  if (mark.standing === 'subject') return []
  switch (mark.what) {
    case 'rivet': return [...rivetSizes(statement, mark), ...headOf(statement, mark), ...alloyOf(statement, mark)]
    case 'head': return headOf(statement, mark)
    case 'bolt': return [...boltSize(statement, mark), ...threadOf(statement, mark)]
    case 'screw': return screwSize(statement, mark, machineScrewDiameter(Number(mark.name)))
    case 'thread': return screwSize(statement, mark, mark.low)
    default: return []
  }
})

const copula = /^[\s,]*(?:rivets?|bolts?|screws?|shank|nominal|solid)*\s*(?:\(|=|:|is|are|means?|has|have|measures?|stands for|works out|comes out|equals|translates to|decodes|reads as|denotes|indicates)\b/
/** What may stand between a name and the size it is said to have. */
const sayingWords = new Set(`= : ( ) is are means mean has have a an the of in inch diameter dia diam nominal shank size long length and by x × , with at which that stands for equals denotes about rivet rivets bolt bolts screw screws solid its it universal flush round head so i.e . thick wide
  measures translates to decodes as reads works out hardware part`.split(/\s+/))

function saidOf(statement: Statement, mark: Mark): Mark[] {
  if (!copula.test(behind(statement, mark)) && !/^ ?[(:=]/.test(behind(statement, mark))) return sizeIsNamed(statement, mark)
  const said: Mark[] = []
  for (let place = placeOf(statement, mark) + 1; place < statement.items.length; place += 1) {
    const item = statement.items[place]
    if (item?.type === 'word' && !sayingWords.has(item.text)) break
    if (item?.type === 'mark' && item.what !== 'length') break
    if (item?.type === 'mark') said.push(item)
  }
  return said.filter(({ standing }) => standing === 'claim')
}

/** "A 5/32 rivet is an AN470AD5". */
function sizeIsNamed(statement: Statement, mark: Mark): Mark[] {
  return claims(statement).filter((size) => size.what === 'length' && size.end <= mark.start && /^\s*(?:in\.? |inch )?(?:diameter |solid |flush |universal )*(?:rivets?|bolts?)?\s*(?:is|are|=|means)\s*(?:an? |the |called )*$/.test(between(statement, size, mark)))
}

function rivetSizes(statement: Statement, rivet: Mark): Finding[] {
  return saidOf(statement, rivet).slice(0, 2).flatMap((size, index, all) => {
    if (['hole', 'drill', 'edge', 'apart', 'sheet', 'grip'].includes(nounOf(statement, size)) || /\b(?:edge|pitch|hole)\b/.test(between(statement, rivet, size))) return []
    const dimension = dimensionOf(statement, size)
    const isLength = dimension === 'length' || (dimension !== 'width' && index === 1 && dimensionOf(statement, all[0] ?? size) !== 'length')
    const value = isLength ? rivet.length : rivet.low
    if (value === undefined) return [finding([rivet, size], 'cannot-tell', 'rivet')]
    return [same(rivet, size, value, 'rivet', `${length(rivet.low).display.inch}${rivet.length ? ` by ${length(rivet.length).display.inch}` : ''}: diameter in 32nds, length in 16ths`, cite('rivet-code', 'worked'))]
  })
}

function boltSize(statement: Statement, bolt: Mark): Finding[] {
  const entry = boltOf(bolt)
  return saidOf(statement, bolt).slice(0, 2).flatMap((size, index) => {
    if (['hole', 'drill', 'edge', 'grip', 'thread', 'washer', 'other', 'nut', 'tube'].includes(nounOf(statement, size)) || /^\W*(?:in\.? )?(?:hex|head|across)/.test(behind(statement, size)) || /^\W*(?:in\.? )?(?:of )?(?:grip|shank|stack)/.test(behind(statement, size)) || /\bgrip\b|\bhole\b|\bwrench\b|\bstack\b/.test(between(statement, bolt, size))) return []
    const isLength = dimensionOf(statement, size) === 'length' || (index === 1 && /\bby\b|[x×]/.test(between(statement, bolt, size)))
    // Its length is the bolt kind's affair; here only "3/16 by 21/32".
    if (isLength) return dimensionOf(statement, size) === 'length' || !entry ? [] : [same(bolt, size, entry.length, 'bolt', `${length(entry.length).display.inch} long`, cite(bolts.lengths.cite, 'worked'), 0.035)]
    return [same(bolt, size, bolt.low, 'bolt', `${length(bolt.low).display.inch}: diameter in 16ths`, cite(bolts.code.cite))]
  })
}

function same(name: Mark, size: Mark, value: number, table: string, expected: string, citation: ReturnType<typeof cite>, slack = 0.001): Finding {
  return judge({ marks: [name, size], low: size.low, high: size.high, slack: Math.max(slack, size.step / 2), table, result: 'part' }, [{ low: value, high: value, expected, citation }], [])
}

function threadOf(statement: Statement, bolt: Mark): Finding[] {
  const row = bolts.threads.rows.find((known) => known.bolt === /^AN\d+/.exec(bolt.name)?.[0])
  const said = claims(statement).filter((mark) => mark.what === 'thread' && mark.start > bolt.start && /^[\s,]*(?:bolts?)?\s*(?:\(|=|:|is|are|has|have|takes?|uses?|with|comes? with|cut)[\s]*(?:a |an |the |cut |threaded )*$/.test(between(statement, bolt, mark)))
  const reversed = claims(statement).filter((mark) => mark.what === 'thread' && mark.end <= bolt.start && /^\s*(?:threads?|bolts?)?\s*(?:is|=|means)\s*(?:an? |the |on |on the )*$/.test(between(statement, mark, bolt)))
  return [...said, ...reversed].flatMap((thread) => (row ? [finding([bolt, thread], thread.name === row.thread || (row.bolt === 'AN16' && thread.name === '1-12') ? 'agrees' : 'conflicts', 'bolt', row.thread, cite(bolts.threads.cite))] : []))
}

function screwSize(statement: Statement, screw: Mark, inches: number | null): Finding[] {
  if (inches === null || nounOf(statement, screw) === 'nut' || hasAny(statement, 'head', 'heads', 'hex', 'washer')) return []
  return saidOf(statement, screw).slice(0, 1).flatMap((size) => {
    if (nounOf(statement, size) === 'hole' || dimensionOf(statement, size) === 'length') return []
    return [same(screw, size, inches, 'drill', `${inches.toFixed(3)} in`, { source: SCREW_SOURCE, basis: SCREW_SOURCE.basis, notes: [] }, 0.003)]
  })
}

const flushSaid = /^[\s,]*(?:rivets?)?\s*(?:=|:|is|are|means?|has|have|\()\s*(?:an? |the )?(?:\d+[ -]?degree )?(?:flush|countersunk|csk)\b/
const roundSaid = /^[\s,]*(?:rivets?)?\s*(?:=|:|is|are|means?|has|have|\()\s*(?:an? |the )?(?:universal|round|protruding|domed?|brazier)\b/

/** AN470 is universal, AN426 flush. */
function headOf(statement: Statement, mark: Mark): Finding[] {
  const isFlush = /426|1097/.test(mark.what === 'head' ? mark.raw : mark.name)
  if (!isFlush && !/470/.test(mark.what === 'head' ? mark.raw : mark.name)) return []
  const rest = behind(statement, mark)
  const claim = flushSaid.test(rest) ? true : roundSaid.test(rest) ? false : undefined
  const other = /^\s*(?:is|are|=|replaces?|equals|is the same as|and)\s*(?:the )?(?:same as |old |new |equal to |number for )*(?:an|ms) ?(?:20)?(4[27][06])/.exec(rest)
  const words = isFlush ? 'flush, 100 degrees' : 'universal head'
  if (other && !/^\s*and/.test(rest)) return [finding([mark], (other[1] === '426') === isFlush ? 'agrees' : 'conflicts', 'rivet', words, cite('rivet-code'))]
  return claim === undefined ? [] : [finding([mark], claim === isFlush ? 'agrees' : 'conflicts', 'rivet', words, cite('rivet-code'))]
}

const alloyNames: Record<string, string> = { AD: '2117', A: '1100', D: '2017', DD: '2024' }

function alloyOf(statement: Statement, mark: Mark): Finding[] {
  const code = /(?:470|426|^)(AD|DD|A|D)\d/.exec(mark.name)?.[1] ?? ''
  const said = /^[\s,]*(?:rivets?)?\s*(?:=|:|is|are|means?|made of|\()\s*(?:made of )?(?:alloy )?(2117|1100|2017|2024|7050|5056)\b/.exec(behind(statement, mark))?.[1]
  const alloy = alloyNames[code]
  return said && alloy ? [finding([mark], said === alloy ? 'agrees' : 'conflicts', 'rivet', alloy, code.length === 1 || code === 'AD' ? cite('rivet-alloy') : COMMON_PRACTICE)] : []
}

/** Sentences about the numbering itself: "the diameter of a rivet is in 32nds". */
export const dashUnits: Kind = ({ statement }) => {
  const { text } = statement
  if (statement.marks.some(({ standing }) => standing === 'subject') || hasAny(statement, 'sheet', 'tolerance', 'gap')) return []
  const unit = /\b(?:in|counts?|of|means?|is|are)\s+(?:the )?(thirty-?seconds?|32nds|sixteenths?|16ths|eighths?|8ths)\b/.exec(text)
  const about = /\b(?:dash|number|digit|code|designation|(?:diameters?|lengths?) (?:is|are|of|in))\b/.test(text)
  const isRivet = hasAny(statement, 'rivet', 'rivets') || statement.marks.some(({ what }) => what === 'rivet' || what === 'head')
  const isBolt = hasAny(statement, 'bolt', 'bolts') || statement.marks.some(({ what }) => what === 'bolt')
  if (!unit || !about || isRivet === isBolt || hasAny(statement, 'nas')) return []
  const of = /^(?:thirty|32)/.test(unit[1] ?? '') ? 32 : /^(?:sixteen|16)/.test(unit[1] ?? '') ? 16 : 8
  const front = text.slice(0, unit.index)
  const isLength = /\b(?:length|long|second|last|grip)\b[^,;]*$/.test(front)
  const isDiameter = /\b(?:diameter|first|dia)\b[^,;]*$/.test(front)
  if (isLength === isDiameter || (isBolt && isLength)) return []
  const right = isRivet ? (isLength ? 16 : 32) : 16
  const start = statement.offset + unit.index + unit[0].length - (unit[1] ?? '').length
  const place: Mark = { type: 'mark', what: 'length', start, end: start + (unit[1] ?? '').length, raw: unit[1] ?? '', low: 0, high: 0, step: 0, unit: '', name: '', dimension: '', standing: 'claim' }
  return [finding([place], of === right ? 'agrees' : 'conflicts', isRivet ? 'rivet' : 'bolt', `in ${right === 32 ? '32nds' : '16ths'} of an inch`, cite(isRivet ? 'rivet-code' : bolts.code.cite))]
}

