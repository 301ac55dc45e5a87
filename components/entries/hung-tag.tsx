// Manila tags hung on a rail by a string: the mentors' desk, and other cases on a part. The open one is white and joins the sheet below.
import type { Route } from 'next'
import Link from 'next/link'

export interface HungTagProps {
  /** What it waits for or has: 'Second stamp', 'Open question', 'In question'. */
  label: string
  title: string
  href: Route
  note?: string | undefined
  /** The section's code. */
  code?: string | undefined
  /** Ink border and a reversed label: a stamp in question. */
  inQuestion?: boolean
  /** The sheet below is this tag's. */
  current?: boolean
}

function tagClass(inQuestion: boolean): string {
  return inQuestion ? 'hung-tag hung-tag-question' : 'hung-tag'
}

export function HungTag({ label, title, href, note, code, inQuestion = false, current = false }: HungTagProps) {
  return (
    <Link href={href} className={tagClass(inQuestion)} aria-current={current ? 'true' : undefined}>
      <span className="hung-hole" aria-hidden="true" />
      <span className="label">{label}</span>
      <span className="hung-tag-title">{title}</span>
      {note ? <span className="hung-tag-note">{note}</span> : null}
      {code ? <span className="code">{code}</span> : null}
    </Link>
  )
}

/** The rail itself. It scrolls sideways when the tags don't fit, and takes its name from `label`. */
export function TagRail({ label, tags }: { label: string, tags: readonly HungTagProps[] }) {
  if (tags.length === 0) return null
  return (
    <ul className="rail" aria-label={label}>
      {tags.map((tag) => (
        <li key={tag.href}>
          <svg className="hung-string" viewBox="0 0 16 67" preserveAspectRatio="none" strokeWidth="1.4" aria-hidden="true" focusable="false">
            <ellipse cx="8.5" cy="7" rx="3.6" ry="5.5" />
            <path d="M8 12C4.5 24 6 46 9 66" />
          </svg>
          <HungTag {...tag} />
        </li>
      ))}
    </ul>
  )
}
