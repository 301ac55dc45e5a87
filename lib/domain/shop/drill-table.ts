// The drills table: a size by any name or measure, what it is, the nearest below and above, and the smallest that passes a screw.
// The series are drill-series.ts; clearance of bolts stands in the bolt table, of tube and conduit in the grommet table.
import { ARITHMETIC, cite, HOLE_NOTE, MEMORY_NOTE, type Citation } from './citation'
import { drillsOf, nearestDrill, nextDrill, type Drill } from './drill-series'
import { machineScrewDiameter, SCREW_SOURCE, SCREWS, smallestDrillFor } from './screw-clearance'
import { drillSize, noValue, result, thickness } from './shop-result'
import { defineTable, type ShopResult } from './shop-table'

/** "E, 1/4": the names of all drills of one diameter. */
export function drillNames(drill: Drill): string {
  return drillsOf(drill.inches).map(({ name }) => name).join(', ')
}

/** One drill as a result, or "the table ends here". */
export function drillResult(name: string, drill: Drill | null, otherwise: string, note?: string): ShopResult {
  if (!drill) return result(name, noValue('in'), cite('drill-number'), { note: otherwise })
  return result(name, drillSize(drill, drillNames(drill)), cite(drill.cite), { note })
}

export const drillTable = defineTable({
  slug: 'drills',
  title: 'Drill sizes',
  inputs: [
    { name: 'size', label: 'Size', unit: 'in', kind: 'drill', min: 0.001, max: 2, default: '#30', hint: 'a drill by name, or a diameter' },
    { name: 'screw', label: 'Machine screw to pass', unit: '', kind: 'choice', options: SCREWS.map((size) => ({ value: `#${size}`, label: `#${size} screw`, aliases: [String(size)] })), default: null },
  ],
  results: [
    { name: 'size', label: 'Diameter', unit: 'in' },
    { name: 'drill', label: 'Drill of this size', unit: 'in' },
    { name: 'nearest', label: 'Nearest drill', unit: 'in' },
    { name: 'below', label: 'Next below', unit: 'in' },
    { name: 'above', label: 'Next above', unit: 'in' },
    { name: 'screw-drill', label: 'Smallest drill that passes the screw', unit: 'in' },
    { name: 'screw', label: 'Diameter of the screw', unit: 'in' },
  ],
  cautions: ['eyes', 'sharp-edges'],
  work(given) {
    const inches = given.number('size')
    const [exact] = drillsOf(inches)
    const nearest = nearestDrill(inches)
    const off = nearest && !exact ? `${Math.abs(nearest.inches - inches).toFixed(4)} in ${nearest.inches > inches ? 'over' : 'under'}` : undefined
    return [
      result('size', thickness(inches, 4), ARITHMETIC),
      drillResult('drill', exact ?? null, 'no number, letter or fraction drill has this diameter'),
      drillResult('nearest', nearest, 'none', off),
      drillResult('below', nextDrill(inches, -1), 'the table begins at #80, 0.0135 in'),
      drillResult('above', nextDrill(inches, 1), 'the table ends at 1 in'),
      ...screwResults(given.optionalWord('screw')),
    ]
  },
})

/** A drill of the same number is another size: #8 the screw is 0.164, #8 the drill 0.199. */
function screwResults(screw: string | undefined): ShopResult[] {
  const size = Number(screw?.slice(1))
  const diameter = screw === undefined ? null : machineScrewDiameter(size)
  const drill = screw === undefined ? null : smallestDrillFor(size)
  if (diameter === null || !drill) return []
  const recalled: Citation = { source: { title: SCREW_SOURCE.title, section: SCREW_SOURCE.section, year: SCREW_SOURCE.year }, basis: SCREW_SOURCE.basis, notes: [MEMORY_NOTE] }
  return [
    result('screw-drill', drillSize(drill, drillNames(drill)), recalled, { how: 'the first drill not under the screw', note: `a close fit; ${HOLE_NOTE}` }),
    result('screw', thickness(diameter), recalled, { how: '0.060 + 0.013 n' }),
  ]
}
