// The signal word on its colour, with the safety alert triangle. ANSI Z535.6: NOTICE carries no triangle, since nobody is hurt by it.

export type SignalWord = 'WARNING' | 'CAUTION' | 'NOTICE'

const classes: Record<SignalWord, string> = { WARNING: 'signal-warning', CAUTION: 'signal-caution', NOTICE: 'signal-notice' }
// Whole class names, since the style sheet is built from what it finds in the source.
const holes: Record<SignalWord, string> = { WARNING: 'fill-warning', CAUTION: 'fill-caution', NOTICE: '' }
const severity: Record<SignalWord, number> = { WARNING: 3, CAUTION: 2, NOTICE: 1 }

/** The word a group of cautions stands under: that of the worst harm in it. */
export function gravestWord(words: readonly SignalWord[]): SignalWord {
  return words.reduce<SignalWord>((worst, word) => (severity[word] > severity[worst] ? word : worst), 'NOTICE')
}

export function CautionWord({ word, id }: { word: SignalWord, id?: string }) {
  return (
    <strong className={`signal ${classes[word]}`} id={id}>
      {word === 'NOTICE' ? null : (
        <svg viewBox="0 0 28 25" width="17" height="15" aria-hidden="true" focusable="false">
          <path d="M14 1 27 24H1Z" fill="currentColor" stroke="currentColor" strokeWidth="1.5" strokeLinejoin="round" />
          <path className={holes[word]} d="M12.5 8.5h3l-.5 8h-2Zm.1 9.5h2.8v2.8h-2.8Z" />
        </svg>
      )}
      {word}
    </strong>
  )
}
