'use client'
// Says that the connection is gone, and what still works. Empty otherwise; the live region stays, so that the change is announced.
import { useSyncExternalStore } from 'react'

function subscribe(changed: () => void): () => void {
  window.addEventListener('online', changed)
  window.addEventListener('offline', changed)
  return () => {
    window.removeEventListener('online', changed)
    window.removeEventListener('offline', changed)
  }
}

export function ConnectionBanner() {
  const online = useSyncExternalStore(subscribe, () => navigator.onLine, () => true)
  return (
    <div role="status" className={online ? undefined : 'connection-banner'}>
      {online ? null : <p className="page">The connection is gone. What you write stays on this device: send it when you are back. Advice on this page may have been withdrawn since.</p>}
    </div>
  )
}
