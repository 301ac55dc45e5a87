// How long it takes until something happens when for some it has not happened yet: the product-limit estimate. Pure.
// E. L. Kaplan and P. Meier, "Nonparametric estimation from incomplete observations", J. Amer. Statist. Assoc. 53 (1958) 457-481;
// variance by Greenwood's formula (M. Greenwood, 1926).

/** `time` in any unit, from the beginning; `happened` false = still waiting then (censored). */
export interface Observation { time: number; happened: boolean }

export interface SurvivalStep {
  time: number
  /** Still waiting just before. */
  atRisk: number
  /** Happened at this time. */
  events: number
  /** Share still waiting after it, 0 … 1. */
  waiting: number
  /** Standard error of `waiting`; 0 where nobody is left. */
  standardError: number
}

export interface SurvivalCurve {
  /** Times at which it happened, ascending. */
  steps: SurvivalStep[]
  /** The first time at which no more than half still wait; null while more than half do. */
  median: number | null
}

/** Censored at the same time as an event count as at risk then. Times below 0 or not finite are left out. */
export function kaplanMeier(observations: readonly Observation[]): SurvivalCurve {
  const sorted = observations.filter(({ time }) => Number.isFinite(time) && time >= 0).sort((a, b) => a.time - b.time)
  const times = [...new Set(sorted.filter((o) => o.happened).map((o) => o.time))]
  const steps: SurvivalStep[] = []
  let waiting = 1
  let variance = 0
  for (const time of times) {
    const atRisk = sorted.filter((o) => o.time >= time).length
    const events = sorted.filter((o) => o.happened && o.time === time).length
    waiting *= 1 - events / atRisk
    if (atRisk > events) variance += events / (atRisk * (atRisk - events))
    steps.push({ time, atRisk, events, waiting, standardError: waiting === 0 ? 0 : waiting * Math.sqrt(variance) })
  }
  // A product of fractions that is a half exactly may stand a rounding above it.
  return { steps, median: steps.find((step) => step.waiting <= 0.5 + 1e-12)?.time ?? null }
}
