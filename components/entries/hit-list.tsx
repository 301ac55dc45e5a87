// Hits as rows of one sheet, and the grouped plate of all their cautions above a page of them.
import type { ReactNode } from 'react'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import { hitKindLine } from '@/lib/format/kind-line'
import type { Caution } from '@/lib/schemas/post'
import type { Hit } from '@/lib/schemas/search'
import type { Route } from 'next'
import { HitRow } from './hit-row'
import { Sheet } from './sheet'

/** One sheet; nothing when there are no hits. `balloons`: those of a computed answer on the same page, which hits are keyed to. */
export function HitList({ hits, balloons = [], actionFor }: { hits: readonly Hit[]; balloons?: readonly { n: number; label: string }[]; actionFor?: (hit: Hit) => ReactNode }) {
  if (hits.length === 0) return null
  return (
    <Sheet>
      {hits.map((hit) => (
        <HitRow key={hit.id} kindLine={hitKindLine(hit)} title={hit.title} href={hit.url as Route} cautions={standing(hit)} snippet={hit.snippet} marks={hit.marks}
          orderAdvice={hit.orderAdvice} partTags={hit.partTags} outcomes={hit.outcomes} critical={hit.needsTwo} stamps={hit.stamps} stampState={hit.stamp} planChanges={hit.planChanges} action={actionFor?.(hit)}
          anchor={hitAnchor(hit)} balloons={hit.balloons.flatMap((n) => balloons.find((balloon) => balloon.n === n) ?? [])} />
      ))}
    </Sheet>
  )
}

/** The id of a hit's row on its page. */
export const hitAnchor = ({ id }: Pick<Hit, 'id'>): string => `hit-${id}`

/**
 * `also`: cautions of a computed answer on the same page. One plate for all hits of a page, a short line a topic with on how many of them it stands; the full texts head each entry.
 * A list has to leave room for what was looked up.
 */
export function HitPlate({ hits, also = [] }: { hits: readonly Hit[]; also?: readonly Caution[] }) {
  const plate = groupCautions([...hits.map((hit) => ({ where: String(hit.id), cautions: standing(hit) })), { where: '', cautions: also }])
  if (!plate) return null
  const short = new Map([...also, ...hits.flatMap((hit) => hit.cautions)].map((c) => [c.code, c.short] as const))
  return (
    <CautionPlate brief cautions={plate.lines.map((line) => {
      const on = line.where.filter((w) => w !== '').length
      const where = hits.length === 1 || on === 0 ? undefined : `${on} of ${hits.length}`
      return { ...line, text: withoutTopic(short.get(line.code) ?? line.text), where }
    })} />
  )
}

/** A short text begins with its topic ("Eyes: safety glasses …"), which the plate prints by itself. */
function withoutTopic(short: string): string {
  const rest = short.replace(/^[^:]{1,40}:\s*/, '')
  return rest.charAt(0).toUpperCase() + rest.slice(1)
}

const standing = (hit: Hit) => hit.cautions.filter((c) => !c.waived)
