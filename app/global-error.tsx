'use client'
// The last resort when the house itself does not stand: brings its own html and leans on no stylesheet.

export default function GlobalError({ retry }: { error: unknown; retry: () => void }) {
  return <html lang="en"><body><h1>Pilothole broke</h1><p>Nothing that was posted is lost. Reload in a moment; if it stays, tell your steward.</p><button type="button" onClick={retry}>Try again</button></body></html>
}
