// All results of an answer in rows: value, the same in the other system, how, whose. One value from several sources is one row;
// values that differ are rows under one another. A table on a desk, stacked on a phone; the roles keep it a table for screen readers.
import { groupReadings } from '@/lib/format/group-readings'
import { capital, HOLE_NOTE, noteWords, valueWords, type FirstSystem } from '@/lib/format/shop-words'
import type { ShopAnswerResult } from '@/lib/schemas/shop'
import { DimensionText } from './dimension-text'
import { SourceList } from './source-list'

const columns = ['Result', 'Value', 'Also', 'How', 'Source, basis'] as const

export function ShopResultList({ results, first }: { results: readonly ShopAnswerResult[]; first: FirstSystem }) {
  const rows = groupReadings(results)
  return (
    <table className="shop-results" role="table">
      <thead role="rowgroup"><tr role="row">{columns.map((title) => <th key={title} scope="col" role="columnheader" className="label">{title}</th>)}</tr></thead>
      <tbody role="rowgroup">
        {rows.map((row, index) => <ResultRow key={index} results={row} first={first} isRepeat={rows[index - 1]?.[0]?.name === row[0]?.name} />)}
      </tbody>
    </table>
  )
}

function ResultRow({ results, first, isRepeat }: { results: readonly ShopAnswerResult[]; first: FirstSystem; isRepeat: boolean }) {
  const [result] = results
  if (!result) return null
  const { text, also } = valueWords(result, first)
  const isSize = result.unit === 'in' && /\d/.test(text)
  return (
    <tr role="row" className={results.some(({ against }) => against) ? 'shop-against' : isRepeat ? 'shop-repeat' : undefined}>
      <th scope="row" role="rowheader">{result.label}</th>
      <td role="cell" className={/\d/.test(text) ? 'shop-value' : 'shop-value shop-value-words'}>{isSize ? <DimensionText text={text} /> : text}</td>
      <td role="cell" className="shop-other">{also}</td>
      <td role="cell" className="shop-how">
        {[...new Set(results.flatMap(({ how }) => how ?? []))].map((how) => <span key={how}>{how}</span>)}
        {results.some(({ note }) => noteWords(note).isHole) ? <span className="shop-note">{capital(HOLE_NOTE)}.</span> : null}
      </td>
      <td role="cell" className="shop-whose"><SourceList results={results} /></td>
    </tr>
  )
}
