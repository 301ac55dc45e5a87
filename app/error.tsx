'use client'
// Something broke on this page. Says what to do, and the digest under which it was logged.
import { Button } from '@/components/ui/button'
import { EmptyState } from '@/components/ui/empty-state'

export default function PageError({ error, retry }: { error: unknown; retry: () => void }) {
  const digest = error instanceof Error && 'digest' in error ? String(error.digest) : ''
  return <EmptyState level={1} title="Something broke here" action={<Button look="primary" onClick={retry}>Try again</Button>}><p>What you typed is kept on this device. If it happens again, tell your steward{digest ? <> this number: <b>{digest}</b></> : null}.</p></EmptyState>
}
