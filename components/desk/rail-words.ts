// What a tag on the desk's rail says: why it hangs there, what can hurt, how many go by it.
import type { SignalWord } from '@/lib/domain/cautions/rule-table'
import type { RailReason } from '@/lib/domain/desk/order-rail'
import type { Missing } from '@/lib/domain/stamps/stamp-state'

const labels: Record<RailReason, string> = {
  'in-question': 'In question', second: 'Second stamp', first: 'No stamp', lapsed: 'Lapsed', 'plans-changed': 'Plans changed', 'mentor-gone': 'Look again', 'open-question': 'Open question',
}
const notes: Record<RailReason, string> = {
  'in-question': 'Did not work since it was stamped.', second: '', first: '', lapsed: 'The text changed since its stamp.', 'plans-changed': 'A bulletin changed its step.',
  'mentor-gone': 'Its mentor is suspended.', 'open-question': 'Nobody has said what to do.',
}

interface TagWords {
  readonly reason: RailReason
  readonly missing: Missing
  readonly needsTwo: boolean
  readonly caution: { readonly signalWord: SignalWord, readonly title: string } | null
  readonly goingBy: number
}

/** 'Second stamp'; 'Firm basis' where two stamps stand and neither on paper. */
export function tagLabel({ reason, missing, needsTwo }: TagWords): string {
  if (reason === 'second' && missing === 'firm-basis') return 'Firm basis'
  return reason === 'first' && needsTwo ? 'First stamp' : labels[reason]
}

/** 'WARNING Primary structure. 6 go by it.': the worst caution always first, since a title never stands without one. */
export function tagNote({ reason, caution, goingBy }: TagWords): string {
  const going = goingBy === 0 ? '' : `${goingBy} ${goingBy === 1 ? 'goes' : 'go'} by it.`
  return [caution ? `${caution.signalWord} ${caution.title}.` : '', notes[reason], going].filter((part) => part !== '').join(' ')
}
