// The log of a section, newest first: day and hours at the left, what was done at the right.
import type { Route } from 'next'
import Link from 'next/link'
import type { ReactNode } from 'react'
import { formatDate } from '@/lib/format/date'
import { formatHours } from '@/lib/format/hours'
import type { LogLine } from '@/lib/schemas/builds'

export interface LogListProps {
  lines: readonly LogLine[]
  /** Where a line is changed; without it the log is only read. */
  changeAt?: (line: LogLine) => Route
  /** The open form of the line that is being changed. */
  form?: { lineId: number; content: ReactNode } | null
}

export function LogList({ lines, changeAt, form = null }: LogListProps) {
  return (
    <ol className="sheet log-list">
      {lines.map((line) => (
        <li key={line.id} id={`line-${line.id}`}>
          <p className="log-when"><span className="whole">{formatDate(`${line.day}T00:00:00Z`)}</span> <b className="whole">{formatHours(line.minutes)}</b></p>
          <div className="log-what">
            {form?.lineId === line.id ? form.content : <LogWords line={line} />}
          </div>
          {changeAt && form?.lineId !== line.id ? <Link className="tap" href={changeAt(line)}>Change<span className="sr-only"> the line of {formatDate(`${line.day}T00:00:00Z`)}</span></Link> : null}
        </li>
      ))}
    </ol>
  )
}

function LogWords({ line: { line, page, steps, helpers } }: { line: LogLine }) {
  const place = [page, steps ? `${/^\d+$/.test(steps) ? 'step' : 'steps'} ${steps}` : ''].filter(Boolean).join(' · ')
  return (
    <>
      {line ? <p>{line}</p> : null}
      {place || helpers ? <p className="text-small text-ink-soft">{[place, helpers ? `with ${helpers}` : ''].filter(Boolean).join(' · ')}</p> : null}
      {!line && !place && !helpers ? <p className="text-small text-ink-soft">No words.</p> : null}
    </>
  )
}
