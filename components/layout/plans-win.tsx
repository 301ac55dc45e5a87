// The line that stands under everything the product says: the plans win.
import { NoticeLine } from '@/components/ui/notice-line'

/** `maker` is the kit maker's name where one kit is meant. */
export function PlansWin({ maker }: { maker?: string | undefined }) {
  return (
    <NoticeLine icon="plans">
      <b>The plans win.</b> {maker ? `${maker}’s` : 'The kit maker’s'} current plans and bulletins, your authority’s rules and a licensed mechanic come first.
    </NoticeLine>
  )
}
