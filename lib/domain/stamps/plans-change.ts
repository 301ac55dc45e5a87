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
/** 'Page W3-2' and 'p. W3-2' are W3-2. */
export const pageName = (text: string) => plain(text).replace(/^(?:pages?|pg\.?|p\.)(?=.)/, '')

const stepWord = /\bsteps?\b\.?/g
const oneStep = /^\s*(\d{1,4}[a-z]?|[a-z])\s*$/
const stepRange = /^\s*(\d{1,4})[a-z]?\s*(?:-|–|\bto\b|\bthrough\b|\bthru\b)\s*(\d{1,4})[a-z]?\s*$/

/** '3-5' and '3 through 5' name 3, 4 and 5; '3, 4 and 7' names three. Null for words that are not understood: they may mean any step of the page. */
export function stepsNamed(text: string): ReadonlySet<string> | null {
  const named = new Set<string>()
  for (const part of text.toLowerCase().replace(stepWord, ' ').split(/,|;|\/|&|\band\b|\bor\b/)) {
    const [range, one] = [stepRange.exec(part), oneStep.exec(part)]
    const [from, to] = [Number(range?.[1]), Number(range?.[2])]
    if (range && to >= from && to - from <= 200) for (let n = from; n <= to; n++) named.add(String(n))
    else if (one?.[1]) named.add(one[1])
    else if (part.trim() !== '') return null
  }
  return named.size > 0 ? named : null
}

/** 6a is part of 6. */
const isSameStep = (a: string, b: string) => a === b || (a.replace(/[a-z]$/, '') !== '' && a.replace(/[a-z]$/, '') === b.replace(/[a-z]$/, '') && (/^\d+$/.test(a) || /^\d+$/.test(b)))

/** Same page and, where both name steps that are understood, one the same. Who names a page without a step means all of it. */
export function isSamePlace(a: PlansPlace, b: PlansPlace): boolean {
  if (pageName(a.page) !== pageName(b.page)) return false
  if (!a.step || !b.step) return true
  const [mine, theirs] = [stepsNamed(a.step), stepsNamed(b.step)]
  if (mine === null || theirs === null) return true
  return [...mine].some((step) => [...theirs].some((other) => isSameStep(step, other)))
}

const escaped = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')
const stepsBehind = /^\s*,?\s*(?:rev(?:ision)?\.?\s+[a-z]{1,2}\s*,?\s*)?steps?\b\.?((?:\s*(?:,|&|\/|-|–|\band\b|\bor\b|\bto\b|\bthrough\b|\bthru\b)?\s*(?:steps?\b\.?\s*)?(?:\d+[a-z]?|[a-z])\b)+)/i

/** Whether a stamp's reference, free text such as 'W3-2 step 6, edge note', names `place`. */
export function namesPlace(reference: string, place: PlansPlace): boolean {
  const page = [...pageName(place.page)].map(escaped).join('\\s*')
  if (page === '') return false
  const found = new RegExp(`(?<![\\w-])${page}(?![\\w-])`, 'gi')
  return [...reference.matchAll(found)].some((match) => {
    const steps = stepsBehind.exec(reference.slice(match.index + match[0].length))?.[1]
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
