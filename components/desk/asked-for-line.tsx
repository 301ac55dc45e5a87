// What a mentor waits for before stamping, on the sheet of the post: its author answers with a remark or an edit.
import { NoticeLine } from '@/components/ui/notice-line'
import type { AskFor } from '@/lib/schemas/acts'
import { askForSentences } from './ask-for-words'

export function AskedForLine({ requests }: { requests: readonly AskFor['what'][] }) {
  if (requests.length === 0) return null
  return <NoticeLine icon="desk" boxed><b>A mentor asks for</b> {requests.map((what) => askForSentences[what]).join('; ')}. The author answers with a remark or an edit.</NoticeLine>
}
