// Dates as the product writes them, from UTC milliseconds or an ISO moment with its zone; a day is the UTC day, so that server and browser say the same.
// Months are spelled here because en-GB in current ICU writes "Sept", which the pictures and stamps don't.

/** UTC milliseconds, or an ISO 8601 moment such as '2026-03-11T09:30:00.000Z'. */
export type Moment = number | string

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const
const fullMonths = ['January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December'] as const
const dayMs = 86_400_000

/** '9 Mar 2026'. */
export function formatDate(at: Moment): string {
  const date = new Date(at)
  return `${date.getUTCDate()} ${months[date.getUTCMonth()]} ${date.getUTCFullYear()}`
}

/** '9 March 2026', for sentences that are read aloud. */
export function formatFullDate(at: Moment): string {
  const date = new Date(at)
  return `${date.getUTCDate()} ${fullMonths[date.getUTCMonth()]} ${date.getUTCFullYear()}`
}

/** '11 MAR 26', as pressed in the middle of a stamp. */
export function formatStampDate(at: Moment): string {
  const date = new Date(at)
  return `${date.getUTCDate()} ${months[date.getUTCMonth()]} ${String(date.getUTCFullYear() % 100).padStart(2, '0')}`.toUpperCase()
}

/** '2026-03-09', for the datetime attribute. */
export function isoDate(at: Moment): string {
  return new Date(at).toISOString().slice(0, 10)
}

/** How long ago, in whole UTC days, weeks, months or years: 'today', 'yesterday', '3 days ago', '5 weeks ago'. A future day reads 'today'. */
export function formatAge(at: Moment, now: Moment): string {
  const days = Math.floor(new Date(now).getTime() / dayMs) - Math.floor(new Date(at).getTime() / dayMs)
  if (days <= 0) return 'today'
  if (days === 1) return 'yesterday'
  if (days < 14) return `${days} days ago`
  if (days < 61) return `${Math.floor(days / 7)} weeks ago`
  if (days < 730) return `${Math.floor(days / 30.44)} months ago`
  return `${Math.floor(days / 365.25)} years ago`
}
