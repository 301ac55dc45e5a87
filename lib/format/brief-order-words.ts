// The order of tasks in words: what the strip draws is said beside it, so that nobody needs the drawing.
import type { Brief, Said } from '@/lib/schemas/brief'

/** '1 builder', '3 builders'. */
export const builderWords = (n: number) => `${n} ${n === 1 ? 'builder' : 'builders'}`

/** 'W3-2 · step 6', and how many more places; null where the plans don't name the task. */
export function stepWords(steps: readonly { page: string; step?: string | undefined }[]): string | null {
  const [first, ...more] = steps
  if (!first) return null
  return `${first.page}${first.step ? ` · step ${first.step}` : ''}${more.length > 0 ? ` and ${more.length} more` : ''}`
}

/** '3 builders do this before flute flanges, where the plans have it after.' */
export function departureWords({ builders, after }: Said): string {
  return `${builderWords(builders)} ${builders === 1 ? 'does' : 'do'} this before “${after.title}”, where the plans have it after.`
}

/** '3 prime parts, then dimple ribs'. */
export function sideWords({ builders, before, after }: Said): string {
  return `${builders} ${before.title}, then ${after.title}`
}

/** What the order on this page follows where builders disagree. */
export function followedWords({ kind, sides, followed }: Brief['order']['disagreements'][number]): string {
  const side = sides.find((s) => s.before.slug === followed?.before && s.after.slug === followed.after)
  if (side) return `This page follows the ${side.builders}: ${side.before.title}, then ${side.after.title}.`
  return kind === 'ring' ? 'Taken together this goes round in a ring. This page follows none of it.' : 'As many say one as the other. This page follows neither.'
}

/** From whom the order is, in one sentence. */
export function originWords({ builders, ownBuilders, otherKits, hasBaseLine }: Brief['order']): string {
  const own = ownBuilders === 0 ? 'No builder has said in which order yet' : `Order from ${builderWords(ownBuilders)} of this section`
  const base = hasBaseLine ? 'over the plans’ own steps' : 'the plans’ steps are not entered here'
  const others = otherKits.map((o) => `${builderWords(o.builders)} of ${o.kit} ${o.section} ${o.title}`).join(', ')
  return `${own}, ${base}.${others === '' || builders === 0 ? '' : ` This section has little of its own: ${others} ${otherKits.length === 1 && otherKits[0]?.builders === 1 ? 'is' : 'are'} counted too (same system).`}`
}
