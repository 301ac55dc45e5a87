// Round places on an axis that begins at 0. Pure.

/** Ascending, from 0 to the first round place at or beyond `end`; steps of 1, 2 or 5 times a power of ten, so that about `wanted` fit. */
export function axisTicks(end: number, wanted = 5): number[] {
  if (!(end > 0) || !Number.isFinite(end)) return [0, 1]
  const raw = end / wanted
  const power = 10 ** Math.floor(Math.log10(raw))
  const step = [1, 2, 5, 10].map((times) => times * power).find((candidate) => candidate >= raw * (1 - 1e-9)) ?? 10 * power
  return Array.from({ length: Math.ceil(end / step - 1e-9) + 1 }, (_, index) => Number((index * step).toPrecision(12)))
}
