// The grouped plate that heads a page: one signal word, the gravest, and a line for each topic with where on the page it applies.
// ANSI Z535.6 groups messages so that the word is read once and each line still is.
import { useId } from 'react'
import { CautionWord, gravestWord, type SignalWord } from './caution-word'

export interface PlateCaution {
  readonly code: string
  readonly signalWord: SignalWord
  readonly title: string
  readonly text: string
  /** Where on this page it applies: 'Found, rows 1, 2, 3'. */
  readonly where?: string | undefined
}

/** `brief` sets the lines in two columns where there is room: the plate of a list. */
export function CautionPlate({ cautions, brief = false }: { cautions: readonly PlateCaution[], brief?: boolean }) {
  const id = useId()
  if (cautions.length === 0) return null
  return (
    <section className={brief ? 'caution-plate caution-plate-brief' : 'caution-plate'} aria-labelledby={id}>
      <CautionWord word={gravestWord(cautions.map((caution) => caution.signalWord))} id={id} />
      <ul>
        {cautions.map((caution) => (
          <li key={caution.code}>
            <b>{caution.title}.</b> {caution.text}
            {caution.where ? <> <span className="caution-where">{caution.where}</span></> : null}
          </li>
        ))}
      </ul>
    </section>
  )
}
