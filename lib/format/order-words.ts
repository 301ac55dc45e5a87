// Order advice in words, and whether what is shown together disagrees. Nothing is merged: contrary advice is said as such.

export interface ShownAdvice { readonly before: string; readonly after: string }

/** "deburr edges before flute flanges; deburr holes before flute flanges", each once. */
export function orderWords(advice: readonly ShownAdvice[]): string {
  return [...new Set(advice.map(({ before, after }) => `${before} before ${after}`))].join('; ')
}

/** The first pair that is advised both ways round; null when nothing is. */
export function findContrary(advice: readonly ShownAdvice[]): { one: string; other: string } | null {
  const said = new Set(advice.map(({ before, after }) => JSON.stringify([before, after])))
  const contrary = advice.find(({ before, after }) => said.has(JSON.stringify([after, before])))
  return contrary ? { one: contrary.before, other: contrary.after } : null
}
