// How a shop result reads: its number, its basis and source, its notes. Where it stands on the page is the component's.
import { HOLE_NOTE, MEMORY_NOTE, NO_SOURCE_NOTE } from '@/lib/domain/shop/citation'
import type { ShopInput } from '@/lib/domain/shop/shop-input'
import type { ShopResult, Source } from '@/lib/domain/shop/shop-table'

export type FirstSystem = 'inch' | 'metric'
type Shown = Pick<ShopResult, 'value' | 'unit' | 'display'>

export { HOLE_NOTE }

/** The number as it stands largest, its unit smaller beside it, and the same otherwise below it. */
export interface BigNumber {
  number: string
  unit: string
  also: string
}

/** "5/8" "in" "0.625 in · 15.88 mm"; a drill by its name with its decimal below: "#30", "0.1285 in · 3.26 mm". */
export function bigNumber({ value, unit, display }: Shown, first: FirstSystem): BigNumber {
  const isDrill = unit === 'in' && value.number !== undefined && value.label !== undefined && display.inch.startsWith(`${value.label} · `)
  if (isDrill) {
    const decimal = display.inch.slice(`${value.label} · `.length)
    return { number: value.label ?? '', unit: '', also: first === 'inch' ? `${decimal} · ${display.metric}` : `${display.metric} · ${decimal}` }
  }
  const [shown, other] = first === 'inch' ? [display.inch, display.metric] : [display.metric, display.inch]
  const { number, unit: unitWords } = split(shown)
  const decimal = first === 'inch' && unit === 'in' && value.number !== undefined && number.includes('/') ? `${value.number.toFixed(3)} in` : ''
  return { number, unit: unitWords, also: [decimal, other === shown ? '' : other].filter(Boolean).join(' · ') }
}

/** A number and its unit; words stay whole. A range gets a dash, which stands closer than "to". */
function split(shown: string): { number: string; unit: string } {
  const match = /^((?:at least )?-?\d[\d./-]*(?: to -?\d[\d./-]*)?)(?: (.*))?$/.exec(shown)
  return match ? { number: (match[1] ?? '').replace(' to ', '–'), unit: match[2] ?? '' } : { number: shown, unit: '' }
}

/** The value first in the reader's system and the other one, each with its unit. */
export function valueWords({ display }: Shown, first: FirstSystem): { text: string; also: string } {
  const [text, also] = first === 'inch' ? [display.inch, display.metric] : [display.metric, display.inch]
  return { text, also: also === text ? '' : also }
}

/** "FAA AC 43.13-1B, para 4-57 (1998)". */
export function sourceWords({ title, section, year }: Source): string {
  const place = [title, section].filter(Boolean).join(', ')
  return /\d/.test(year) ? `${place} (${year})` : place
}

/** What stands beside a number about where it comes from. `isLoud`: it must be read before the number is used. */
export function basisWords({ basis, source }: Pick<ShopResult, 'basis' | 'source'>): { text: string; source: string; isLoud: boolean } {
  const named = source ? sourceWords(source) : ''
  switch (basis) {
    case 'seen': return { text: 'seen', source: named, isLoud: false }
    case 'arithmetic': return { text: named ? 'arithmetic by its rule' : 'arithmetic on what was entered', source: named, isLoud: false }
    case 'memory': return { text: MEMORY_NOTE, source: named, isLoud: true }
    case 'common-practice': return { text: NO_SOURCE_NOTE, source: named, isLoud: true }
    case 'maker': return { text: 'the kit maker’s own limit', source: named, isLoud: true }
  }
}

/** Notes without those that the basis says, and without the standing words under a hole, which `isHole` reports. */
export function noteWords(note: string | undefined): { text: string; isHole: boolean } {
  const isHole = note?.includes(HOLE_NOTE) ?? false
  const text = [MEMORY_NOTE, NO_SOURCE_NOTE, HOLE_NOTE].reduce((rest, standing) => rest.replace(standing, ''), note ?? '')
  return { text: text.split('; ').map((part) => part.trim()).filter(Boolean).join('; '), isHole }
}

export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1)

/** What an input takes, in one short line below its field. */
export function inputHelp({ hint, kind, unit, min, max }: Pick<ShopInput, 'hint' | 'kind' | 'unit' | 'min' | 'max'>): string {
  const shown = unit === 'lbf-in' ? 'in-lb' : unit
  const limits = min === undefined || max === undefined || kind === 'choice' ? '' : `${Number(min.toFixed(4))} to ${Number(max.toFixed(4))} ${shown}`.trim()
  const also = kind === 'length' ? 'or mm' : kind === 'drill' ? 'or a drill, or mm' : kind === 'torque' ? 'or N·m' : ''
  return [hint, [limits, also].filter(Boolean).join(', ')].filter(Boolean).join('; ')
}
