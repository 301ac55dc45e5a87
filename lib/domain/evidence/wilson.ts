// Wilson score interval for a proportion. Pure.

/**
 * Lower bound of the Wilson score interval, two-sided, without continuity correction.
 * @param successes count, 0 … trials
 * @param trials count; 0 trials give 0
 * @param z normal quantile; 1.959964 for 95 %
 * @returns a proportion 0 … 1
 * Source: E. B. Wilson, "Probable inference, the law of succession, and statistical inference", JASA 22 (1927) 209-212.
 */
export function wilsonLowerBound(successes: number, trials: number, z = 1.959963984540054): number {
  if (trials <= 0) return 0
  const p = successes / trials
  const z2 = z * z
  const centre = p + z2 / (2 * trials)
  const spread = z * Math.sqrt((p * (1 - p)) / trials + z2 / (4 * trials * trials))
  return Math.max(0, (centre - spread) / (1 + z2 / trials))
}
