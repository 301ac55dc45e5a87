// Percentiles of what was measured, and the table they are shown in.

export interface Spread { count: number; p50: number; p95: number; p99: number; max: number }

/** The nearest-rank percentiles of `values`, in their unit, to a tenth. */
export function spreadOf(values: readonly number[]): Spread {
  const sorted = [...values].sort((a, b) => a - b)
  const at = (share: number) => round(sorted[Math.max(0, Math.ceil(share * sorted.length) - 1)] ?? 0)
  return { count: sorted.length, p50: at(0.5), p95: at(0.95), p99: at(0.99), max: at(1) }
}

/** To a tenth. */
export const round = (value: number): number => Math.round(value * 10) / 10
