// Chance that repeats: the same seed gives the same corpus and the same questions, so that two measurements compare.

export interface Chance {
  /** 0 … 1, 1 excluded. */
  next(): number
  /** A whole number from 0 to `below`, `below` excluded. */
  below(below: number): number
  /** One of `items`, each as likely. */
  pick<T>(items: readonly T[]): T
  /** One of `items`, the first ones far more often: words of a trade are not used equally. */
  pickCommon<T>(items: readonly T[]): T
}

/** A generator of 32 bits (mulberry32), good enough to choose words. */
export function seededRandom(seed: number): Chance {
  let state = seed >>> 0
  const next = (): number => {
    state = (state + 0x6d2b79f5) >>> 0
    let t = state
    t = Math.imul(t ^ (t >>> 15), t | 1)
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61)
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296
  }
  const below = (limit: number) => Math.floor(next() * limit)
  const at = <T>(items: readonly T[], index: number): T => {
    const item = items[index]
    if (item === undefined) throw new Error('Nothing to pick from')
    return item
  }
  return {
    next, below,
    pick: (items) => at(items, below(items.length)),
    pickCommon: (items) => at(items, Math.floor(next() ** 2.5 * items.length)),
  }
}
