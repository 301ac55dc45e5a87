// How many slips of the finger lie between two words: a letter missing, too many, wrong, or two changed round.

/**
 * Optimal string alignment distance (Damerau-Levenshtein with adjacent transpositions), in UTF-16 units.
 * Gives `limit + 1` as soon as it is certain that the distance is larger than `limit`.
 */
export function editDistance(a: string, b: string, limit: number): number {
  if (Math.abs(a.length - b.length) > limit) return limit + 1
  let beforeLast: number[] = []
  let last = Array.from({ length: b.length + 1 }, (_, i) => i)
  for (let i = 1; i <= a.length; i++) {
    const row = [i]
    let least = i
    for (let j = 1; j <= b.length; j++) {
      const same = a.charCodeAt(i - 1) === b.charCodeAt(j - 1) ? 0 : 1
      let cost = Math.min(at(last, j) + 1, at(row, j - 1) + 1, at(last, j - 1) + same)
      const turned = i > 1 && j > 1 && a.charCodeAt(i - 1) === b.charCodeAt(j - 2) && a.charCodeAt(i - 2) === b.charCodeAt(j - 1)
      if (turned) cost = Math.min(cost, at(beforeLast, j - 2) + 1)
      row.push(cost)
      if (cost < least) least = cost
    }
    if (least > limit) return limit + 1
    beforeLast = last
    last = row
  }
  return Math.min(at(last, b.length), limit + 1)
}

const at = (row: readonly number[], index: number): number => row[index] ?? Infinity
