'use client'
// Says that a draft was brought back, and how to be rid of it.
import { Button } from '@/components/ui/button'
import { NoticeLine } from '@/components/ui/notice-line'

const clock = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', hour: '2-digit', minute: '2-digit' })

export function DraftNotice({ savedAt, onThrowAway }: { savedAt: number; onThrowAway: () => void }) {
  return <NoticeLine boxed live>Your draft of {clock.format(savedAt)} is back. It was kept on this device only. <Button look="quiet" small onClick={onThrowAway}>Throw it away</Button></NoticeLine>
}
