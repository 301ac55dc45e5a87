// Where the middle half of some numbers lies. Pure.
// Percentiles as in NIST/SEMATECH e-Handbook of Statistical Methods, section 7.2.6.2: place p(N + 1) in the sorted list, between two by parts.

export interface Quartiles { lower: number; median: number; upper: number }

/** Null for an empty list. */
export function quartiles(values: readonly number[]): Quartiles | null {
  if (values.length === 0) return null
  return { lower: percentile(values, 0.25), median: percentile(values, 0.5), upper: percentile(values, 0.75) }
}

/** @param share 0 … 1; at the ends the smallest and the largest value @throws RangeError for an empty list */
export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b)
  const [smallest, largest] = [sorted[0], sorted[sorted.length - 1]]
  if (smallest === undefined || largest === undefined) throw new RangeError('percentile of nothing')
  const place = share * (sorted.length + 1)
  const whole = Math.floor(place)
  if (whole < 1) return smallest
  const below = sorted[whole - 1]
  const above = sorted[whole]
  if (below === undefined || above === undefined) return largest
  return below + (place - whole) * (above - below)
}
