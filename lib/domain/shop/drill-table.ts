// The drills table: a size by any name or measure, what it is, and the nearest below and above. The series are drill-series.ts.
import { cite, ARITHMETIC } from './citation'
import { drillsOf, nearestDrill, nextDrill, type Drill } from './drill-series'
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
  inputs: [{ name: 'size', label: 'Size', unit: 'in', kind: 'drill', min: 0.001, max: 2, default: '#30', hint: 'a drill by name, or a diameter' }],
  results: [
    { name: 'size', label: 'Diameter', unit: 'in' },
    { name: 'drill', label: 'Drill of this size', unit: 'in' },
    { name: 'nearest', label: 'Nearest drill', unit: 'in' },
    { name: 'below', label: 'Next below', unit: 'in' },
    { name: 'above', label: 'Next above', unit: 'in' },
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
    ]
  },
})
