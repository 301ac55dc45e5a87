// An answer as it heads a page: the drawing, the number beside it, the notes keyed by balloon. On a phone the number stands right under
// the drawing. The form and the list of all results are elsewhere.
import { tableFigures } from '@/lib/domain/shop/figures/table-figures'
import { leadResults } from '@/lib/domain/shop/lead-results'
import type { FirstSystem } from '@/lib/format/shop-words'
import type { ShopAnswer } from '@/lib/schemas/shop'
import { AgainstList } from './against-list'
import { BalloonNotes, type BalloonNotesProps } from './balloon-notes'
import { figureWidths, ShopFigures, type ShopFiguresProps } from './shop-figures'
import { ShopLead } from './shop-lead'

export interface ShopAnswerViewProps {
  answer: Pick<ShopAnswer, 'table' | 'inputs' | 'results' | 'readAs'>
  first: FirstSystem
  /** Boxes on the dimensions; absent where the figure only shows. */
  entries?: ShopFiguresProps['entries']
  /** Posts on the same page that speak of a balloon. */
  posts?: BalloonNotesProps['posts']
}

export function ShopAnswerView({ answer, first, entries, posts }: ShopAnswerViewProps) {
  const drawn = (width: number) => tableFigures(answer.table, answer.inputs, answer.results, width, first)
  const desk = drawn(figureWidths.desk)
  return (
    <div className={desk.length > 0 ? 'shop-answer shop-answer-drawn' : 'shop-answer'}>
      {desk.length > 0 ? <ShopFigures desk={desk} phone={drawn(figureWidths.phone)} entries={entries} /> : null}
      <div className="shop-beside">
        <ShopLead results={leadResults(answer.table, answer.results)} first={first} />
        <AgainstList results={answer.results} />
      </div>
      <BalloonNotes balloons={desk.flatMap(({ balloons }) => balloons)} posts={posts} />
      <p className="print-only"><b>Worked out for:</b> {answer.readAs}</p>
    </div>
  )
}
