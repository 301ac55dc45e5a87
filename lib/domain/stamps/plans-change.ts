// Which bulletins change a step that a post or its stamps name. Pure; when a bulletin was entered decides, not when it was printed.

export interface PlansPlace { page: string; step?: string | null | undefined }

/** A bulletin as a post's judgement sees it. */
export interface BulletinFact {
  number: string
  /** When it was entered here, UTC milliseconds. */
  enteredAt: number
  steps: readonly (PlansPlace & { revision: string })[]
}

/** One place of a bulletin that a post is about. */
export interface PlansChange { bulletin: string; enteredAt: number; page: string; step: string | null; revision: string }

const plain = (text: string) => text.toLowerCase().replace(/\s+/g, '')

/** '3-5' and '3 to 5' name 3, 4 and 5; '3, 4 and 7' names three; anything else names itself. */
export function stepsNamed(text: string): ReadonlySet<string> {
  const named = new Set([plain(text)])
  for (const part of text.toLowerCase().split(/,|;|\/|&|\band\b/)) {
    const range = /^\s*(\d{1,4})\s*(?:-|–|\bto\b)\s*(\d{1,4})\s*$/.exec(part)
    const [from, to] = [Number(range?.[1]), Number(range?.[2])]
    if (range && to >= from && to - from <= 200) for (let n = from; n <= to; n++) named.add(String(n))
    else if (plain(part) !== '') named.add(plain(part))
  }
  return named
}

/** Same page and, where both name one, the same step. Who names a page without a step means all of it. */
export function isSamePlace(a: PlansPlace, b: PlansPlace): boolean {
  if (plain(a.page) !== plain(b.page)) return false
  if (!a.step || !b.step) return true
  const steps = stepsNamed(a.step)
  return [...stepsNamed(b.step)].some((step) => steps.has(step))
}

const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')

/** Whether a stamp's reference, free text such as 'W3-2 step 6, edge note', names `place`. */
export function namesPlace(reference: string, place: PlansPlace): boolean {
  const page = [...plain(place.page)].map(escaped).join('\\s*')
  if (page === '') return false
  const found = new RegExp(`(?<![\\w-])${page}(?![\\w-])`, 'gi')
  return [...reference.matchAll(found)].some((match) => {
    const after = reference.slice(match.index + match[0].length)
    const steps = /^\s*,?\s*steps?\s+((?:\d+[a-z]?|[a-z]\b)(?:\s*(?:,|and|to|&|\/|-|–)\s*\d+[a-z]?)*)/i.exec(after)?.[1]
    return isSamePlace({ page: place.page, step: steps }, place)
  })
}

/** Places of these bulletins that `plans` or `references` name, the newest bulletin first. The order of the facts does not matter. */
export function findPlansChanges(bulletins: readonly BulletinFact[], plans: readonly PlansPlace[], references: readonly string[]): PlansChange[] {
  return bulletins
    .flatMap((b) => b.steps.filter((step) => plans.some((p) => isSamePlace(p, step)) || references.some((r) => namesPlace(r, step)))
      .map((step): PlansChange => ({ bulletin: b.number, enteredAt: b.enteredAt, page: step.page, step: step.step ?? null, revision: step.revision })))
    .sort((a, b) => b.enteredAt - a.enteredAt || compare(a.bulletin, b.bulletin) || compare(a.page, b.page) || compare(a.step ?? '', b.step ?? ''))
}

const compare = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0)
