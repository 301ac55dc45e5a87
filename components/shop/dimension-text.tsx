// A size between two dimension arrows. A drill or a length; words and designations stand without arrows.

const left = 'M1 1v11M2.5 6.5H14M7 3 2.5 6.5 7 10'

export function DimensionText({ text }: { text: string }) {
  return <span className="dimension-text whole"><Arrow />{text}<Arrow isRight /></span>
}

function Arrow({ isRight = false }: { isRight?: boolean }) {
  return (
    <svg viewBox="0 0 14 13" width="14" height="13" aria-hidden="true" focusable="false">
      <path d={left} transform={isRight ? 'matrix(-1 0 0 1 14 0)' : undefined} className="dimension-text-arrow" />
    </svg>
  )
}
