// The place where a stamp is missing: a dashed octagon that says which, and who may press it.
import { StampFrame } from './stamp-frame'

export interface EmptyStampProps {
  which: 'only' | 'first' | 'second' | 'firm-basis'
  small?: boolean
}

const words = {
  only: ['Stamp', 'a mentor'],
  first: ['First stamp', 'a mentor'],
  'firm-basis': ['Firm basis', 'plans, standard or maker’s reply'],
  second: ['Second stamp', 'another mentor'],
} as const

export function EmptyStamp({ which, small = false }: EmptyStampProps) {
  const [title, who] = words[which]
  return (
    <p className={small ? 'stamp-empty stamp-empty-small' : 'stamp-empty'}>
      <StampFrame shape="octagon" dashed />
      <span className="sr-only">Missing: </span>
      <b>{title}</b>
      <span>{who}</span>
    </p>
  )
}
