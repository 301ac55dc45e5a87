// Lessons that say the same, found by the words they share. Pure; which of a group speaks for it is the caller's order.
import { analyseText } from '../search/analyse-text'

/** `advice`: the order that it gives, a key for each pair of tasks. */
export interface Alike { id: number; title: string; text: string; builder: string; advice: readonly string[] }
export interface AlikeGroup<T extends Alike> {
  /** The first of the group in the order given. */
  lead: T
  others: T[]
  /** How many different builders say it. */
  builders: number
}

/** Shares of common words from which two say the same: of titles, or of what they say at length. */
const alikeTitles = 0.5
const alikeTexts = 0.34
/** Who gives the same order needs fewer of the same words. */
const alikeWithAdvice = 0.2
/** Fewer words than this match by chance. */
const leastWords = 3

/** Groups in the order of their leads. Whoever is like one of a group belongs to it. */
export function groupAlike<T extends Alike>(lessons: readonly T[]): AlikeGroup<T>[] {
  const known = lessons.map((lesson) => ({ lesson, title: wordsOf(lesson.title), text: wordsOf(`${lesson.title}\n${lesson.text}`) }))
  const groupOf = known.map((_, index) => index)
  known.forEach((one, i) => known.slice(0, i).forEach((other, j) => {
    const wanted = one.lesson.advice.some((pair) => other.lesson.advice.includes(pair)) ? alikeWithAdvice : alikeTexts
    if (sharedWords(one.title, other.title) < alikeTitles && sharedWords(one.text, other.text) < wanted) return
    const [from, to] = [groupOf[i] ?? i, groupOf[j] ?? j]
    groupOf.forEach((group, k) => { if (group === Math.max(from, to)) groupOf[k] = Math.min(from, to) })
  }))
  return [...new Set(groupOf)].sort((a, b) => a - b).flatMap((group) => {
    const [lead, ...others] = lessons.filter((_, index) => groupOf[index] === group)
    return lead ? [{ lead, others, builders: new Set([lead, ...others].map((l) => l.builder)).size }] : []
  })
}

const wordsOf = (text: string): ReadonlySet<string> => new Set(analyseText(text).tokens.map((token) => token.term))

/** Cosine of two sets of words (Salton's measure), 0 … 1. */
export function sharedWords(a: ReadonlySet<string>, b: ReadonlySet<string>): number {
  if (a.size < leastWords || b.size < leastWords) return 0
  const shared = [...a].filter((word) => b.has(word)).length
  return shared / Math.sqrt(a.size * b.size)
}
