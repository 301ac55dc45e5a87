// A date in a time element: '9 Mar 2026', or its age when `now` is given, with the date for whoever points at it.
import { formatAge, formatDate, isoDate, type Moment } from '@/lib/format/date'

export function DateText({ at, now }: { at: Moment, now?: Moment }) {
  return <time dateTime={isoDate(at)} title={now === undefined ? undefined : formatDate(at)} className="whole">{now === undefined ? formatDate(at) : formatAge(at, now)}</time>
}
