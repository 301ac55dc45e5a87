// Hours of a log line as people give them: by the clock (start and stop) or as a length. Minutes leave here; showing them is lib/format/hours.ts.

/** A day has no more. */
export const mostMinutes = 24 * 60

/** Minutes of the day of 'HH:MM' (a 24-hour clock, 00:00 to 23:59), or null. */
function clockMinutes(text: string): number | null {
  const match = /^([01]?\d|2[0-3]):([0-5]\d)$/.exec(text.trim())
  return match ? Number(match[1]) * 60 + Number(match[2]) : null
}

/** Minutes from start to stop. A stop before the start is on the next day; null when either is no time of day, or they are the same. */
export function minutesBetween(start: string, stop: string): number | null {
  const [from, to] = [clockMinutes(start), clockMinutes(stop)]
  if (from === null || to === null || from === to) return null
  return (to - from + mostMinutes) % mostMinutes
}

/** Whole minutes of '2.5', '2,5', '2:30', '2 h 30', '2h 30min', '45 min' or '3 hours'; null for anything else, for nothing, and past 24 hours. */
export function readHours(text: string): number | null {
  const minutes = parse(text.trim().toLowerCase())
  return minutes !== null && minutes >= 1 && minutes <= mostMinutes ? minutes : null
}

function parse(text: string): number | null {
  const decimal = /^(\d{1,2})(?:[.,](\d{1,2}))?\s*(?:h|hours?)?$/.exec(text)
  if (decimal) return Math.round(Number(`${decimal[1]}.${decimal[2] ?? '0'}`) * 60)
  const both = /^(\d{1,2})\s*(?::|h|hours?)\s*([0-5]?\d)\s*(?:m|min|minutes?)?$/.exec(text)
  if (both) return Number(both[1]) * 60 + Number(both[2])
  const alone = /^(\d{1,4})\s*(?:m|min|minutes?)$/.exec(text)
  return alone ? Number(alone[1]) : null
}
