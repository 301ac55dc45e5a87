// How long a question waits for its first answer. Open ones count too, for as long as they have waited.
import 'server-only'
import { listAnswerTimes } from '@/db/queries/evidence'
import type { AppContext } from '@/lib/context'
import { kaplanMeier, type SurvivalCurve } from '@/lib/domain/evidence/kaplan-meier'
import { refuse } from '@/lib/errors'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'

const dayMs = 86_400_000

export interface TimeToAnswer {
  /** Times in days. */
  curve: SurvivalCurve
  asked: number
  open: number
  /** The longest that a question without an answer has waited, in days. */
  longestDays: number
}

/** 403 for all but mentors and stewards. An imported answer older than its question counts as there from the beginning. */
export async function getTimeToAnswer({ actor, reader, now }: AppContext): Promise<TimeToAnswer> {
  if (!can(actor, 'evidence.open')) throw refuse.forbidden(whyNot['evidence.open'])
  const questions = await listAnswerTimes(reader)
  const observations = questions.map(({ askedAt, answeredAt }) => ({ time: Math.max(0, (answeredAt ?? now) - askedAt) / dayMs, happened: answeredAt !== null }))
  return {
    curve: kaplanMeier(observations), asked: questions.length, open: questions.filter((q) => q.answeredAt === null).length,
    longestDays: observations.reduce((longest, { time, happened }) => (happened ? longest : Math.max(longest, time)), 0),
  }
}
