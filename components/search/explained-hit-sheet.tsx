// One hit of an explained search: its cautions, its score as the product it is, and what each factor comes from.
import type { Route } from 'next'
import Link from 'next/link'
import { CautionLine } from '@/components/cautions/caution-line'
import { directWords, evidenceWords, factor, percent, points } from '@/lib/format/explain-words'
import { hitKindLine } from '@/lib/format/kind-line'
import { orderWords } from '@/lib/format/order-words'
import type { ExplainedHit } from '@/lib/schemas/search-explanation'

export function ExplainedHitSheet({ place, explained }: { place: number; explained: ExplainedHit }) {
  const { hit, coverage, holds, text, evidence, directness, shared, score } = explained
  return (
    <article className="hit explained-hit">
      <div className="hit-text">
        <p className="label">{place} · {hitKindLine(hit)}</p>
        <h3><Link href={hit.url as Route}>{hit.title}</Link></h3>
        <CautionLine cautions={hit.cautions.filter((c) => !c.waived)} />
        <p className="explained-score">
          <b>{points(score)}</b> {text > 0 ? <>= text {points(text)} {factor(evidence.factor)} evidence {factor(directness)} directness{shared > 0 ? <> + {points(shared)} shared with the first hits</> : null}</> : 'beyond those that are scored: ranked by what it holds'}
        </p>
        <dl className="explained-parts">
          <div><dt className="label">Holds</dt><dd>{percent(coverage)} of the question: {holds.map(heldWords).join(', ')}</dd></div>
          <div><dt className="label">Evidence</dt><dd>{evidenceWords(evidence)}: {factor(evidence.factor)}</dd></div>
          <div><dt className="label">Directness</dt><dd>{directWords(explained) || 'by its words only'}: {factor(directness)}</dd></div>
          {hit.orderAdvice ? <div><dt className="label">Order advice</dt><dd>{orderWords(hit.orderAdvice)}</dd></div> : null}
        </dl>
        <Terms explained={explained} />
      </div>
    </article>
  )
}

const heldWords = ({ word, looksUp, how, strength }: ExplainedHit['holds'][number]): string =>
  `${word}${how === 'as written' || how === 'plans step' ? '' : ` as ${how}: ${looksUp}`}${strength < 1 ? ` (${percent(strength)})` : ''}`

function Terms({ explained: { hit, terms } }: { explained: ExplainedHit }) {
  if (terms.length === 0) return null
  return (
    <div className="explained-scroll" role="group" aria-label={`Text score of ${hit.title}`} tabIndex={0}>
      <table className="explained-table">
        <thead><tr><th scope="col">Term</th><th scope="col">Points</th><th scope="col">Weight</th><th scope="col">In the title</th><th scope="col">Labels</th><th scope="col">Posts</th></tr></thead>
        <tbody>
          {terms.map((term) => (
            <tr key={term.looksUp}>
              <th scope="row">{term.looksUp}</th><td>{points(term.points)}</td><td>{factor(term.weight)}</td><td>{term.title}</td><td>{term.labels}</td><td>{term.passages}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
