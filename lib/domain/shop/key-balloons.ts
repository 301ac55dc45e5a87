// Which balloons of a computed answer's figure a post speaks of. Conservative: a feature counts where the part is named near it, and
// a post is keyed to what it says most about. Pure, and quick enough for every hit of a search.
import { BALLOON_WORDS } from './balloon-words'
import type { Balloon } from './figures/figure'
import type { ShopResult } from './shop-table'

/** Balloon numbers for a title and a passage, what is spoken of most first; none where nothing is named. */
export type BalloonKeys = (title: string, passage: string) => number[]

/** So far may a feature stand from its part: about a sentence either way. */
const NEAR = 160
/** How much of a passage is read. */
const LONGEST = 1200
/** More than this and the post is about the part as a whole, not about its features. */
const MOST = 2
const IN_TITLE = 3

const escaped = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&')

interface Feature { n: number; words: string; isPart: boolean }

/** Made once a search; null where the figure's features have no words. */
export function keyBalloons(table: string, balloons: readonly Pick<Balloon, 'n' | 'label'>[], results: readonly ShopResult[]): BalloonKeys | null {
  const { part, features } = table === 'drills' ? { part: '', features: drillFeatures(balloons) } : partFeatures(table, balloons, results)
  if (features.length === 0) return null
  // One pass for all: group 1 is the part, the others are features in order. A name ends where a word or a number ends.
  const scan = new RegExp(`(?<![\\w./#])(?:(${part || '(?!)'})|${features.map((feature) => `(${feature.words})`).join('|')})(?![\\w/]|\\.\\d)`, 'gi')
  const naming = new RegExp(`(?<!\\w)(?:${part || '(?!)'})`, 'i')
  return (title, passage) => strongest(features, count({ scan, naming, features }, title, passage.slice(0, LONGEST)))
}

function partFeatures(table: string, balloons: readonly Pick<Balloon, 'n' | 'label'>[], results: readonly ShopResult[]): { part: string; features: Feature[] } {
  const known = Object.hasOwn(BALLOON_WORDS, table) ? BALLOON_WORDS[table] : undefined
  if (!known) return { part: '', features: [] }
  const features = balloons.flatMap(({ n, label }): Feature[] => {
    const words = Object.hasOwn(known.features, label) ? known.features[label] : undefined
    if (words === undefined) return []
    const values = (known.values?.[label] ?? []).flatMap((name) => results.filter((result) => result.name === name).flatMap(({ value }) => spellings(value.number, value.label)))
    const own = words.startsWith('+')
    return [{ n, isPart: own, words: [own ? words.slice(1) : words, ...new Set(values)].join('|') }]
  })
  return { part: known.part, features }
}

/** A drill is named by itself: no part need stand near it. */
function drillFeatures(balloons: readonly Pick<Balloon, 'n' | 'label'>[]): Feature[] {
  return balloons.flatMap(({ n, label }): Feature[] => {
    const names = label.split(', ').filter((name) => /^#?\d/.test(name))
    return names.length === 0 ? [] : [{ n, isPart: true, words: names.map((name) => (name.startsWith('#') ? `#${name.slice(1)}|no\\.? ?${name.slice(1)}` : escaped(name))).join('|') }]
  })
}

/** 5/8, 0.625, .625; of a drill #30, 0.1285. A lone letter is left out: it is a word of its own in any text. */
function spellings(number: number | undefined, label: string | undefined): string[] {
  const names = (label ?? '').split(', ').filter((name) => /\d/.test(name)).map(escaped)
  const decimal = number === undefined ? [] : [`0?\\.${number.toFixed(4).split('.')[1]?.replace(/0+$/, '') ?? ''}0*`]
  return number !== undefined && number < 1 ? [...names, ...decimal] : names
}

/** What each feature is worth in the text: its mentions near the part, in the title the more. */
function count({ scan, naming, features }: { scan: RegExp; naming: RegExp; features: readonly Feature[] }, title: string, passage: string): number[] {
  const text = `${title}\n${passage}`
  const parts: number[] = []
  const mentions: { feature: number; at: number }[] = []
  for (const match of text.matchAll(scan)) {
    if (match[1] !== undefined) { parts.push(match.index); continue }
    // "Lock nuts" is a feature's words that hold the part.
    if (naming.test(match[0])) parts.push(match.index)
    mentions.push({ feature: match.slice(2).findIndex((group) => group !== undefined), at: match.index })
  }
  const worth = features.map(() => 0)
  for (const { feature, at } of mentions) {
    const isNear = features[feature]?.isPart || parts.some((part) => part <= title.length ? at <= title.length + NEAR : Math.abs(part - at) <= NEAR)
    if (isNear) worth[feature] = (worth[feature] ?? 0) + (at <= title.length ? IN_TITLE : 1)
  }
  return worth
}

function strongest(features: readonly Feature[], worth: readonly number[]): number[] {
  return features.map(({ n }, index) => ({ n, worth: worth[index] ?? 0 })).filter((each) => each.worth > 0)
    .sort((a, b) => b.worth - a.worth || a.n - b.n).slice(0, MOST).map(({ n }) => n)
}
