// What the lines of an order strip mean; only what the strip at hand has.

export function StripKey({ hasBaseLine, hasDepartures, hasDisputes }: { hasBaseLine: boolean, hasDepartures: boolean, hasDisputes: boolean }) {
  return (
    <ul className="strip-key no-print">
      <li><Line d="M0 6h36" width={3} />{hasBaseLine ? 'the plans’ own steps, with how many went straight on' : 'builders’ order, with how many went straight on'}</li>
      {hasDepartures ? <li><Line d="M0 6h36" width={2} dashed />builders who departed from the plans</li> : null}
      {hasDisputes ? <li><Line d="M0 6h8M36 6h-8M8 1v10l9-5ZM28 1v10l-9-5Z" width={1.5} />builders who disagree</li> : null}
    </ul>
  )
}

function Line({ d, width, dashed = false }: { d: string, width: number, dashed?: boolean }) {
  return <svg viewBox="0 0 36 12" width="36" height="12" aria-hidden="true" focusable="false"><path d={d} fill="currentColor" stroke="currentColor" strokeWidth={width} strokeDasharray={dashed ? '5 4' : undefined} /></svg>
}
