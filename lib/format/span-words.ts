// Lengths of time in words, from days: a chart and its sentence say the same.

const hour = 1 / 24

/** '40 minutes', '7 hours', '2.5 days', '12 days', '9 weeks'. Whole numbers but for a few days. */
export function spanWords(days: number): string {
  if (days < hour) return counted(Math.round(days * 24 * 60), 'minute')
  if (days < 2) return counted(Math.round(days * 24), 'hour')
  if (days < 10) return `${Number(days.toFixed(1))} days`
  if (days < 60) return counted(Math.round(days), 'day')
  return counted(Math.round(days / 7), 'week')
}

const counted = (n: number, unit: string) => `${n} ${unit}${n === 1 ? '' : 's'}`
