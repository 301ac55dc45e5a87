// A part tag: two cut corners and a punched hole. For sections, tasks and holds; all of one colour, whatever they name.
import type { Route } from 'next'
import Link from 'next/link'

export interface PartTagProps {
  /** A designation such as W-6, set in the instrument face. */
  code?: string | undefined
  title: string
  href?: Route | undefined
}

export function PartTag({ code, title, href }: PartTagProps) {
  const content = (
    <>
      <span className="part-tag-hole" aria-hidden="true" />
      <span>{code ? <><b className="code">{code}</b>{' '}</> : null}{title}</span>
    </>
  )
  return href ? <Link href={href} className="part-tag">{content}</Link> : <span className="part-tag">{content}</span>
}

/** A row of part tags that wraps; nothing when there are none. */
export function PartTags({ items }: { items: readonly PartTagProps[] }) {
  if (items.length === 0) return null
  return <ul className="part-tags">{items.map((item) => <li key={`${item.code ?? ''} ${item.title}`} className="max-w-full"><PartTag {...item} /></li>)}</ul>
}
