// The closing list of a section: what can no longer be reached once it is closed, each line with its answer.
import type { ReactNode } from 'react'
import { formatDate } from '@/lib/format/date'
import type { ClosingLine } from '@/lib/schemas/builds'

const origins: Record<ClosingLine['origin'], string> = { plans: 'From the plans', builder: 'From a builder', inspector: 'From an inspector' }

/** `formOf` is the form of a line; without it the list is only read. */
export function ClosingList({ lines, formOf }: { lines: readonly ClosingLine[]; formOf?: (line: ClosingLine) => ReactNode }) {
  return (
    <ul className="sheet closing-list">
      {lines.map((line) => (
        <li key={line.id}>
          <p><b>{line.text}</b></p>
          <p className="text-small text-ink-soft">{[origins[line.origin], line.reference].filter(Boolean).join(' · ')}</p>
          <p>{line.answer ? <><b>{line.answer.isDone ? 'Done' : 'Not done'}</b>{line.answer.note ? `: ${line.answer.note}` : ''} <span className="text-small text-ink-soft">{formatDate(line.answer.at)}</span></> : 'Still to be looked at.'}</p>
          {formOf?.(line)}
        </li>
      ))}
    </ul>
  )
}
