// The four things a mentor asks an author for, in words.
import type { AskFor } from '@/lib/schemas/acts'

type What = AskFor['what']

/** In the order of the buttons. */
export const askForButtons: readonly { readonly what: What, readonly label: string }[] = [
  { what: 'photo-with-scale', label: 'Photo with a scale' },
  { what: 'page-and-revision', label: 'Page and revision' },
  { what: 'edge-distance', label: 'Edge distance' },
  { what: 'which-side', label: 'Which side' },
]

/** What the author reads: the request, and what answers it. */
export const askForSentences: Record<What, string> = {
  'photo-with-scale': 'a photo with a scale beside the part, or the sizes a photo would show',
  'page-and-revision': 'the plans page and its revision',
  'edge-distance': 'the edge distance, measured',
  'which-side': 'which side it is: left or right, as the pilot sits',
}
