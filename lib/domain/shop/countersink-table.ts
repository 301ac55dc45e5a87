// The countersink-or-dimple table: what each source says about a flush rivet in a sheet of a given thickness.
import data from '@/content/shop/countersink.json'
import { cite } from './citation'
import { inchesOf } from './exact-fraction'
import { amount, noValue, result, thickness, words } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'

const SIZES = ['3/32', '1/8', '5/32', '3/16', '1/4'] as const
export type FlushMethod = 'dimple' | 'countersink'

/** Dimensions of an MS20426 head in inches, or null where the table has none. */
export function flushHead(diameter: string): { headDiameter: number; headHeight: number; angle: number } | null {
  const row = data.heads.rows.find((known) => known.diameter === diameter)
  return row ? { headDiameter: row.headDiameter, headHeight: row.headHeight, angle: data.heads.angle } : null
}

/** What one source says for a sheet, or null where it says nothing. */
export const methodBySource = {
  handbook: (sheet: number): FlushMethod | null => (sheet <= data.dimpleUpTo.thickness + 1e-9 ? 'dimple' : null),
  p40: (sheet: number): FlushMethod => (sheet <= data.countersinkFrom.thickness - 1e-9 ? 'dimple' : 'countersink'),
  head: (sheet: number, diameter: string): FlushMethod | null => {
    const head = flushHead(diameter)
    return head && (sheet > head.headHeight ? 'countersink' : 'dimple')
  },
}

function methods(sheet: number, diameter: string): ShopResult[] {
  const handbook = methodBySource.handbook(sheet)
  const byHead = methodBySource.head(sheet, diameter)
  const [dimple, p40, rule] = [cite(data.dimpleUpTo.cite), cite(data.countersinkFrom.cite), cite(data.headRule.cite)]
  return [
    handbook ? result('method', words('dimple'), dimple, { how: 'dimpling does best up to 0.040 in' })
      : result('method', noValue(''), dimple, { note: 'over 0.040 in: this source is not recalled as choosing', how: 'dimpling does best up to 0.040 in' }),
    result('method', words(methodBySource.p40(sheet)), p40, { how: 'no drilled countersink under 0.051 in' }),
    byHead ? result('method', words(byHead), rule, { how: `the sheet is ${byHead === 'countersink' ? 'thicker than' : 'not thicker than'} the head`, note: 'the safer check' })
      : result('method', noValue(''), rule, { note: `the table gives no head height for a ${diameter} in rivet: measure one` }),
  ]
}

export const countersinkTable = defineTable({
  slug: 'countersink-or-dimple',
  title: 'Countersink or dimple',
  inputs: [
    { name: 'diameter', label: 'Rivet diameter', unit: 'in', kind: 'choice', options: SIZES.map((size) => ({ value: size, label: `${size} in`, aliases: [`-${inchesOf(size) * 32}`, String(inchesOf(size))] })), default: '1/8' },
    { name: 'sheet', label: 'Thickness of the sheet that takes the head', unit: 'in', kind: 'length', min: 0.01, max: 1, default: '0.032' },
  ],
  results: [
    { name: 'method', label: 'Countersink or dimple', unit: '' }, { name: 'head-diameter', label: 'Head across', unit: 'in' }, { name: 'head-height', label: 'Head high', unit: 'in' },
    { name: 'angle', label: 'Angle of the head', unit: 'deg' }, { name: 'sheet-spare', label: 'Sheet left under the head', unit: 'in' },
  ],
  cautions: ['structure', 'eyes'],
  work(given) {
    const [diameter, sheet] = [given.word('diameter'), given.number('sheet')]
    const head = flushHead(diameter)
    const source = cite(data.heads.cite)
    if (!head) return [...methods(sheet, diameter), result('head-diameter', noValue('in'), source, { note: 'the table gives no value for this size' }), result('angle', amount(data.heads.angle, 'deg'), source)]
    const spare = sheet - head.headHeight
    return [
      ...methods(sheet, diameter),
      result('head-diameter', thickness(head.headDiameter), source), result('head-height', thickness(head.headHeight), source), result('angle', amount(head.angle, 'deg'), source),
      spare > 0 ? result('sheet-spare', thickness(spare), source, { how: `${sheet.toFixed(3)} - ${head.headHeight.toFixed(3)}` })
        : result('sheet-spare', noValue('in'), source, { note: 'none: a countersink would go right through the sheet and make the hole larger' }),
    ]
  },
})
