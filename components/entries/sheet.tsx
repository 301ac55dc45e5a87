// The plan sheet: a thin border around content, as sections of a drawing. Its title block is title-block.tsx.
import type { ReactNode } from 'react'

export interface SheetProps {
  as?: 'div' | 'section' | 'article'
  id?: string
  labelledBy?: string
  className?: string
  children: ReactNode
}

export function Sheet({ as: Element = 'div', id, labelledBy, className = '', children }: SheetProps) {
  return <Element id={id} aria-labelledby={labelledBy} className={`sheet ${className}`.trim()}>{children}</Element>
}

/** The head of a sheet: a heading with a note at its right ("Found", "Marit Osei · 8 Mar 2026 · Rev A"). */
export function SheetHead({ title, id, note, level = 2 }: { title: string, id?: string, note?: ReactNode, level?: 2 | 3 }) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return (
    <div className="sheet-head">
      <Heading id={id}>{title}</Heading>
      {note ? <span className="sheet-note">{note}</span> : null}
    </div>
  )
}

/** A numbered row of What to do: the number ruled off at the left. */
export function SheetRow({ number, children }: { number: number, children: ReactNode }) {
  return (
    <div className="sheet-row">
      <div className="sheet-row-number"><span className="sr-only">Row </span>{number}</div>
      <div className="sheet-row-body">{children}</div>
    </div>
  )
}

/** Labelled parts (Doing, Plans say, Measured, Tried): label at the left, stacked on a phone. Empty parts are left out. */
export function SheetParts({ parts }: { parts: readonly { readonly label: string, readonly content: ReactNode }[] }) {
  const filled = parts.filter((part) => part.content !== null && part.content !== undefined && part.content !== '')
  if (filled.length === 0) return null
  return (
    <dl className="found">
      {filled.map((part) => <div key={part.label}><dt className="label">{part.label}</dt><dd>{part.content}</dd></div>)}
    </dl>
  )
}
