// The cautions embedded in one post: a line for each signal word, with at most 12 words a caution. Nothing is left out; the full
// texts stand in the page's plate.
import { CautionWord, type SignalWord } from './caution-word'

export interface LineCaution {
  readonly code: string
  readonly signalWord: SignalWord
  readonly short: string
}

const order: readonly SignalWord[] = ['WARNING', 'CAUTION', 'NOTICE']

/** `wide` stretches the lines across their column, as in the rows of a sheet. */
export function CautionLine({ cautions, wide = false }: { cautions: readonly LineCaution[], wide?: boolean }) {
  const groups = order
    .map((word) => ({ word, cautions: cautions.filter((caution) => caution.signalWord === word) }))
    .filter((group) => group.cautions.length > 0)
  if (groups.length === 0) return null
  return (
    <div className="caution-lines">
      {groups.map((group) => (
        <p key={group.word} className={wide ? 'caution-line caution-line-wide' : 'caution-line'}>
          <CautionWord word={group.word} />{' '}
          <span className="caution-line-text">
            {group.cautions.map((caution) => <span key={caution.code}>{caution.short} </span>)}
          </span>
        </p>
      ))}
    </div>
  )
}
