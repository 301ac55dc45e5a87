// Hits as rows of one sheet, and the grouped plate of all their cautions above a page of them.
import type { ReactNode } from 'react'
import { ListPlate } from '@/components/cautions/list-plate'
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

/** One plate for all hits of a page. `also`: cautions of a computed answer on the same page. */
export const HitPlate = ({ hits, also = [] }: { hits: readonly Hit[]; also?: readonly Caution[] }) => <ListPlate items={hits} also={also} />

/** The id of a hit's row on its page. */
export const hitAnchor = ({ id }: Pick<Hit, 'id'>): string => `hit-${id}`

const standing = (hit: Hit) => hit.cautions.filter((c) => !c.waived)
