// Working time as the product writes it, from whole minutes.

/** '45 min', '2 h', '2 h 30 min', '112 h 5 min'; '0 h' for nothing. */
export function formatHours(minutes: number): string {
  const [hours, rest] = [Math.floor(minutes / 60), minutes % 60]
  if (hours === 0 && rest > 0) return `${rest} min`
  return rest === 0 ? `${hours} h` : `${hours} h ${rest} min`
}
