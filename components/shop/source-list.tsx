// Whose a value is: each source with its basis and what it says aside, the firmest first. What has no source, or was not looked up,
// says so in bold.
import { basisWords, capital, noteWords } from '@/lib/format/shop-words'
import type { ShopAnswerResult } from '@/lib/schemas/shop'

const firmness: Readonly<Record<ShopAnswerResult['basis'], number>> = { maker: 0, seen: 1, arithmetic: 2, memory: 3, 'common-practice': 4 }

/** `results` have one value. */
export function SourceList({ results }: { results: readonly ShopAnswerResult[] }) {
  const ordered = results.toSorted((a, b) => firmness[a.basis] - firmness[b.basis])
  return (
    <ul className="shop-sources">
      {ordered.map((result, index) => {
        const note = noteWords(result.note).text
        return <li key={index}><SourceLine result={result} />{note ? <span className="shop-note">{capital(note)}.</span> : null}</li>
      })}
    </ul>
  )
}

function SourceLine({ result }: { result: ShopAnswerResult }) {
  const { text, source, isLoud } = basisWords(result)
  if (isLoud) return <><b>{text}</b>{source ? <span className="shop-source">: {source}</span> : null}</>
  return source ? <>{source} <span className="shop-basis">{text}</span></> : <span className="shop-basis">{text}</span>
}
