// How it went, as one riveted joint seen in section, in date order: a set rivet (as written), a temporary fastener (with a change),
// an open hole with a tag (did not work). The words beside it say the same. Never an average.
import type { Moment } from '@/lib/format/date'
import { outcomePhrases, type OutcomeCounts, type OutcomeResult } from '@/lib/format/outcome-words'

export interface HowItWentProps {
  /** Items may come in any order; they are drawn by `createdAt`. */
  outcomes: OutcomeCounts & { readonly items: readonly { readonly result: OutcomeResult, readonly note: string, readonly createdAt: Moment }[] }
  /** On a critical system: "went together as written". */
  critical: boolean
  /** Show the builder's words where a result was told once. */
  notes?: boolean
}

const mostGlyphs = 20

/** One pitch of the joint, 29 × 36 px; the sheets run through to the neighbour. */
function Glyph({ result }: { result: OutcomeResult }) {
  return (
    <svg viewBox="0 0 29 36" width="29" height="36" fill="currentColor" aria-hidden="true" focusable="false">
      {result === 'did-not-work' ? <OpenHole /> : <Joined rivet={result === 'as-written'} />}
    </svg>
  )
}

function Joined({ rivet }: { rivet: boolean }) {
  return (
    <>
      <path d="M0 18.5h29M0 22h29M0 25.5h29" stroke="currentColor" strokeWidth="1.25" />
      <path d="M0 20.25h29M0 23.75h29" stroke="currentColor" strokeWidth="1.5" opacity="0.28" />
      {rivet ? (
        <path d="M6.5 18.5C6.5 14.5 10 12.5 14.5 12.5S22.5 14.5 22.5 18.5H18V25.5H19.5L20 30.5H9L9.5 25.5H11V18.5Z" />
      ) : (
        <>
          <path className="fill-sheet" d="M8.5 6.5h12v12h-12Z" stroke="currentColor" strokeWidth="1.5" />
          <path d="M8.5 10h12M8.5 14.5h12" stroke="currentColor" strokeWidth="1.25" />
          <path d="M12 1.5h5v5h-5Z" />
          <path className="fill-sheet" d="M12 18.5h5v8h-5Z" />
          <path d="M13 18.5v10l-1.5 2M16 18.5v10l1.5 2" fill="none" stroke="currentColor" strokeWidth="1.5" />
        </>
      )}
    </>
  )
}

function OpenHole() {
  return (
    <>
      <path d="M0 10h9.5M0 13.5h9.5M0 17h9.5M9.5 9.4v8.2M19.5 10H29M19.5 13.5H29M19.5 17H29M19.5 9.4v8.2" stroke="currentColor" strokeWidth="1.25" />
      <path d="M14.5 2.5v18" stroke="currentColor" strokeWidth="1" strokeDasharray="5 1.5 1.5 1.5" />
      <path className="fill-sheet" d="M8 34.5v-10l3.5-3.5h6l3.5 3.5v10Z" stroke="currentColor" strokeWidth="1.5" />
      <path d="M14.5 23v1.5M11 28h7M11 31h4.5" stroke="currentColor" strokeWidth="1.25" />
    </>
  )
}

/** Over 20 reports one glyph stands for a result, with its count: a row of dots that long tells nothing. */
function Joint({ outcomes }: Pick<HowItWentProps, 'outcomes'>) {
  if (outcomes.items.length > mostGlyphs) {
    const groups = [['as-written', outcomes.asWritten], ['with-change', outcomes.withChange], ['did-not-work', outcomes.didNotWork]] as const
    return groups.map(([result, count]) => count > 0
      ? <span key={result} className="how-group"><Glyph result={result} /><b>× {count}</b></span>
      : null)
  }
  return [...outcomes.items].sort((a, b) => new Date(a.createdAt).getTime() - new Date(b.createdAt).getTime()).map((item, index) => <Glyph key={index} result={item.result} />)
}

export function HowItWent({ outcomes, critical, notes = false }: HowItWentProps) {
  const phrases = outcomePhrases(outcomes, critical, notes)
  if (phrases.length === 0) return null
  return (
    <div className="how">
      <div className="how-joint" aria-hidden="true"><Joint outcomes={outcomes} /></div>
      <p className="how-words">
        <span className="sr-only">How it went: </span>
        {phrases.map((phrase, index) => <span key={phrase.words}>{index > 0 ? ' · ' : null}<b>{phrase.count}</b> {phrase.words}</span>)}
      </p>
    </div>
  )
}
