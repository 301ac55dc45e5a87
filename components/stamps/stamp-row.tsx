// The stamps of one post side by side, and the empty places of those it still needs. Content for the stamps cell of a title block.
import type { Missing, StampState } from '@/lib/domain/stamps/stamp-state'
import type { StampFace } from '@/lib/format/stamp-words'
import { EmptyStamp, type EmptyStampProps } from './empty-stamp'
import { StampOctagon } from './stamp-octagon'

export interface StampRowProps {
  stamps: readonly (StampFace & { readonly id: number | string })[]
  state: StampState
  needsTwo: boolean
  /** What still lacks, as the stamp state was judged. */
  missing: Missing
}

/** The label over the row: 'Stamps · 1 of 2' on a critical system, 'Stamp' where one is enough. */
export function stampCount({ stamps, needsTwo }: Pick<StampRowProps, 'stamps' | 'needsTwo'>): string {
  const live = stamps.filter((stamp) => stamp.live).length
  if (needsTwo) return `Stamps · ${Math.min(live, 2)} of 2`
  return stamps.length > 1 ? 'Stamps' : 'Stamp'
}

function emptyPlaces(missing: Missing, needsTwo: boolean): EmptyStampProps['which'][] {
  if (missing === null) return []
  if (missing === 'first') return needsTwo ? ['first', 'second'] : ['only']
  return [missing]
}

export function StampRow({ stamps, state, needsTwo, missing }: StampRowProps) {
  const places = emptyPlaces(missing, needsTwo)
  return (
    <div className="stamp-row">
      {stamps.map((stamp) => <StampOctagon key={stamp.id} stamp={stamp} state={state} />)}
      {places.map((which) => <EmptyStamp key={which} which={which} small={places.length > 1} />)}
      {state === 'imported' ? <p className="stamp-imported">Stamped where it came from. Here it counts as not stamped.</p> : null}
    </div>
  )
}
