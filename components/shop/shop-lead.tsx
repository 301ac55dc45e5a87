// The number one came for, as large as a sign, with whose it is and what must be said beside it. Sources that differ stand side by
// side, never blended.
import { bigNumber, capital, HOLE_NOTE, noteWords, type FirstSystem } from '@/lib/format/shop-words'
import { groupReadings } from '@/lib/format/group-readings'
import type { ShopAnswerResult } from '@/lib/schemas/shop'
import { SourceList } from './source-list'

/** `results` are all of one name. */
export function ShopLead({ results, first }: { results: readonly ShopAnswerResult[]; first: FirstSystem }) {
  // A source that gives no value has its say after those that do.
  const readings = groupReadings(results).toSorted((a, b) => Number(isEmpty(a)) - Number(isEmpty(b)))
  const label = results[0]?.label
  if (label === undefined) return null
  const differ = readings.length > 1
  return (
    <div className="shop-lead">
      <p className="label">{label}{differ ? (results[0]?.basis === 'maker' ? ': the kit maker’s own limit wins' : ': the sources differ') : ''}</p>
      <div className={differ ? 'shop-readings shop-readings-several' : 'shop-readings'}>
        {readings.map((reading, index) => <Reading key={index} results={reading} first={first} isAlone={!differ} />)}
      </div>
    </div>
  )
}

const isEmpty = ([result]: readonly ShopAnswerResult[]): boolean => !result || Object.keys(result.value).length === 0

/** Which of the four sizes a number of so many characters is set in: the fewer, the larger. */
function sizeClass(characters: number, isAlone: boolean): string {
  const step = characters <= 4 ? 1 : characters <= 6 ? 2 : characters <= 11 ? 3 : 4
  return `shop-number-${isAlone ? step : Math.min(4, step + 1)}`
}

function Reading({ results, first, isAlone }: { results: readonly ShopAnswerResult[]; first: FirstSystem; isAlone: boolean }) {
  const [result] = results
  if (!result) return null
  const { number, unit, also } = bigNumber(result, first)
  const ways = [...new Set(results.flatMap(({ how }) => how ?? []))]
  return (
    <div className="shop-reading">
      <p className={`shop-number ${sizeClass(number.length, isAlone)}`}><span className="shop-digits">{number}</span>{unit ? <> <span className="shop-number-unit">{unit}</span></> : null}</p>
      {also ? <p className="shop-also">{also}</p> : null}
      {results.some(({ note }) => noteWords(note).isHole) ? <p><b>{capital(HOLE_NOTE)}.</b></p> : null}
      {ways.map((how) => <p key={how} className="shop-said">{capital(how)}.</p>)}
      <SourceList results={results} />
    </div>
  )
}
