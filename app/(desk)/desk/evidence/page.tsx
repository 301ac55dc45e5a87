// How long questions wait for their first answer, for those who can shorten it.
import type { Metadata } from 'next'
import { SurvivalCurveChart } from '@/components/charts/survival-curve'
import { PageTitle } from '@/components/layout/page-title'
import { Disclosure } from '@/components/ui/disclosure'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { requireCan } from '@/lib/auth/guards'
import { spanWords } from '@/lib/format/span-words'
import { paths } from '@/lib/paths'
import { getTimeToAnswer, type TimeToAnswer } from '@/lib/services/evidence/get-time-to-answer'

export const metadata: Metadata = { title: 'Time to an answer' }

export default async function EvidencePage() {
  const told = await getTimeToAnswer(await requireCan('evidence.open'))
  return (
    <>
      <PageTitle title="Time to an answer" lead="How long a question waits for its first answer. Open questions count for as long as they have waited." />
      {told.asked === 0 ? <EmptyState title="Nothing was asked yet" action={<LinkButton href={paths.desk()}>To the desk</LinkButton>}><p>The curve begins with the first question.</p></EmptyState> : <Curve told={told} />}
    </>
  )
}

function Curve({ told: { curve, asked, open, longestDays } }: { told: TimeToAnswer }) {
  const sentence = curve.median === null
    ? `More than half of ${asked === 1 ? 'the one question' : `the ${asked} questions`} still wait, so there is no median yet.`
    : `Half of the ${asked} questions had an answer within ${spanWords(curve.median)}.`
  const waiting = open === 0 ? 'None is open now.' : `${open === 1 ? 'One is' : `${open} are`} open now, the oldest for ${spanWords(longestDays)}.`
  return (
    <section className="sheet chart-sheet" aria-label="Time to an answer">
      <p className="text-heading"><strong>{sentence}</strong> {waiting}</p>
      <SurvivalCurveChart curve={curve} endDays={endOf(curve, longestDays)} label={`Share of questions still without an answer, by days since asked. ${sentence} ${waiting}`} />
      <Disclosure summary="The same as rows">
        <div className="table-scroll" tabIndex={0} role="region" aria-label="The curve as rows">
          <table className="figures-table">
            <thead><tr><th scope="col">After</th><th scope="col">Waiting before</th><th scope="col">Answered</th><th scope="col">Still waiting</th></tr></thead>
            <tbody>
              {curve.steps.map((step) => (
                <tr key={step.time}><td>{spanWords(step.time)}</td><td>{step.atRisk}</td><td>{step.events}</td><td>{Math.round(step.waiting * 100)} % ± {Math.round(step.standardError * 196)}</td></tr>
              ))}
            </tbody>
          </table>
        </div>
      </Disclosure>
      <p className="text-small text-ink-soft">Product-limit estimate (Kaplan and Meier, 1958); ± is 1.96 standard errors by Greenwood’s formula. Hidden questions and answers are left out.</p>
    </section>
  )
}

/** Answers come early or not at all: one question that waits for a year must not press all the others into a line. */
function endOf({ steps }: TimeToAnswer['curve'], longestDays: number): number {
  const last = steps[steps.length - 1]?.time ?? 0
  return last === 0 ? longestDays : Math.min(Math.max(last, longestDays), last * 2)
}
