'use client'
// Says that a draft was brought back, and how to be rid of it.
import { Button } from '@/components/ui/button'
import { NoticeLine } from '@/components/ui/notice-line'
import { formatAge } from '@/lib/format/date'

export function DraftNotice({ savedAt, onThrowAway }: { savedAt: number; onThrowAway: () => void }) {
  return <NoticeLine boxed live>Your draft from {formatAge(savedAt, Date.now())} is back. It was kept on this device only. <Button look="quiet" small onClick={onThrowAway}>Throw it away</Button></NoticeLine>
}
