// What the search made of a question: each word with its share and what is looked up for it, and where it draws the line.
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { factor, percent } from '@/lib/format/explain-words'
import type { SearchExplanation } from '@/lib/schemas/search-explanation'

export function ExplainedQuery({ explanation }: { explanation: SearchExplanation }) {
  const { query, documents, considered } = explanation
  return (
    <Sheet as="section" labelledBy="understood">
      <SheetHead title="Understood as" id="understood" note={`${considered} of ${documents} entries hold a word of it`} />
      {query.concepts.length === 0 ? <p className="sheet-body">Nothing to look up: stop words only.</p> : <Concepts concepts={query.concepts} />}
      <ul className="explained-notes">{notesOf(explanation).map((note) => <li key={note}>{note}</li>)}</ul>
    </Sheet>
  )
}

function Concepts({ concepts }: { concepts: SearchExplanation['query']['concepts'] }) {
  return (
    <div className="explained-scroll" role="group" aria-label="Words of the question" tabIndex={0}>
      <table className="explained-table">
        <thead><tr><th scope="col">As typed</th><th scope="col">Share</th><th scope="col">Looked up as</th></tr></thead>
        <tbody>
          {concepts.map(({ word, share, routes }) => (
            <tr key={word}>
              <th scope="row">{word}</th>
              <td>{percent(share)}</td>
              <td>
                {routes.length === 0 ? 'no entry holds it, nor anything like it' : (
                  <ul>{routes.map((route) => (
                    <li key={`${route.how} ${route.looksUp}`}><b>{route.looksUp}</b> <span className="text-ink-soft">{route.how}, {factor(route.weight)}, counts {percent(route.strength)} as held, in {route.entries} {route.entries === 1 ? 'entry' : 'entries'}</span></li>
                  ))}</ul>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

function notesOf({ query, least, best, cutBelow, cut, total }: SearchExplanation): string[] {
  const { ignored, didYouMean, order, places } = query
  return [
    ...(ignored.length > 0 ? [`Left out: ${ignored.join(', ')}.`] : []),
    ...(didYouMean !== null ? [`Spelling looked up: ${didYouMean}.`] : []),
    ...(order ? [`A question of order: ${order.one.join(', ')} on one side, ${order.other.join(', ')} on the other.`] : []),
    ...places.map(({ page, step }) => `A step of the plans: page ${page.toUpperCase()}, step ${step}.`),
    total > 0
      ? `The best entry holds ${percent(best)} of it; ${percent(least)} are needed for anything to be shown. Entries that hold less than ${percent(cutBelow)} are cut: ${cut}.`
      : `Nothing is shown: the best entry holds ${percent(best)} of it, and ${percent(least)} are needed.`,
  ]
}
