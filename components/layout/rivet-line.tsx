// A section heading with the rivet line running out to its note: small, evenly pitched circles.
import type { ReactNode } from 'react'

export interface RivetLineProps {
  title: string
  id?: string
  note?: ReactNode
  level?: 2 | 3
}

export function RivetLine({ title, id, note, level = 2 }: RivetLineProps) {
  const Heading = level === 2 ? 'h2' : 'h3'
  return (
    <div className="rivet-line">
      <Heading id={id}>{title}</Heading>
      <span className="rivet-line-dots" aria-hidden="true" />
      {note ? <span className="rivet-line-note">{note}</span> : null}
    </div>
  )
}
