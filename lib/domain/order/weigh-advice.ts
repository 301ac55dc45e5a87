// From what builders said about the order of two tasks to one weight a pair: one voice a builder, their newest. Pure.

/** One builder's word: do `before` before `after`. */
export interface Voice {
  /** Who speaks: the same builder counts once a pair. */
  builder: string
  before: string
  after: string
  /** The post it stands in; null where it came from a debrief. */
  postId: number | null
  at: number
}

/** How many builders say that `before` comes before `after`, and where they say it. */
export interface Advice {
  before: string
  after: string
  builders: number
  /** Ascending. */
  postIds: number[]
}

/** Sorted by the tasks' names. A builder who changed their mind counts only for what they said last; a task before itself is nothing. */
export function weighAdvice(voices: readonly Voice[]): Advice[] {
  const newest = new Map<string, Voice>()
  for (const voice of voices) {
    if (voice.before === voice.after) continue
    const key = JSON.stringify([voice.builder, ...[voice.before, voice.after].sort()])
    const known = newest.get(key)
    if (!known || isNewer(voice, known)) newest.set(key, voice)
  }
  const weighed = new Map<string, Advice>()
  for (const { before, after, postId } of newest.values()) {
    const key = JSON.stringify([before, after])
    const advice = weighed.get(key) ?? { before, after, builders: 0, postIds: [] }
    advice.builders += 1
    if (postId !== null && !advice.postIds.includes(postId)) advice.postIds.push(postId)
    weighed.set(key, advice)
  }
  for (const advice of weighed.values()) advice.postIds.sort((a, b) => a - b)
  return [...weighed.values()].sort(byTasks)
}

/** Of two at the same moment the later post counts, so that the answer does not depend on the order given. */
function isNewer(a: Voice, b: Voice): boolean {
  if (a.at !== b.at) return a.at > b.at
  return (a.postId ?? 0) !== (b.postId ?? 0) ? (a.postId ?? 0) > (b.postId ?? 0) : a.before < b.before
}

/** By code units: the same on every machine. */
export function byTasks(a: Pick<Advice, 'before' | 'after'>, b: Pick<Advice, 'before' | 'after'>): number {
  if (a.before !== b.before) return a.before < b.before ? -1 : 1
  return a.after < b.after ? -1 : a.after > b.after ? 1 : 0
}
