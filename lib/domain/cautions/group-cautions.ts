// Cautions as a page shows them: one grouped plate at its head, one embedded line a post (ANSI Z535.6: grouped and embedded messages).
// Which cautions are required is not decided here.
import { CAUTION_TOPICS, SIGNAL_WORDS, type CautionDefinition, type CautionTopic, type SignalWord } from './rule-table'

/** What showing a caution needs; posts' cautions carry more. */
export interface ShownCaution extends Omit<CautionDefinition, 'twoStamps'> {
  /** Set when a moderator waived it on its post. */
  waived?: unknown
}

/** One line of the plate. `where` names the posts it stands on: 'Found', 'row 1'. */
export interface CautionPlateLine {
  code: string
  topic: CautionTopic
  signalWord: SignalWord
  title: string
  text: string
  where: string[]
}

export interface CautionPlate {
  signalWord: SignalWord
  lines: CautionPlateLine[]
}

/** The worst of the signal words, or null for none. */
export function worstSignalWord(cautions: readonly { signalWord: SignalWord }[]): SignalWord | null {
  return SIGNAL_WORDS.find((word) => cautions.some((caution) => caution.signalWord === word)) ?? null
}

/** Worst first; then the critical systems before the workshop, as the topics are listed. Stable otherwise. */
function bySeverity(a: ShownCaution, b: ShownCaution): number {
  return SIGNAL_WORDS.indexOf(a.signalWord) - SIGNAL_WORDS.indexOf(b.signalWord)
    || CAUTION_TOPICS.indexOf(a.topic) - CAUTION_TOPICS.indexOf(b.topic)
}

/** Several posts' cautions as one list, each code once (its first occurrence), worst first. */
export function unionCautions<C extends ShownCaution>(lists: readonly (readonly C[])[]): C[] {
  const byCode = new Map<string, C>()
  for (const caution of lists.flat()) {
    const known = byCode.get(caution.code)
    // Waived on one post, it still stands on another: the standing one speaks.
    if (!known || (known.waived !== undefined && caution.waived === undefined)) byCode.set(caution.code, caution)
  }
  return [...byCode.values()].sort(bySeverity)
}

/**
 * The one plate of a page from its posts' cautions, or null when there are none. One line a topic: the worst caution of it speaks,
 * the texts of its others follow in the same line, so that nothing is hidden and nothing said twice.
 */
export function groupCautions(posts: readonly { where: string; cautions: readonly ShownCaution[] }[]): CautionPlate | null {
  const all = unionCautions(posts.map((post) => post.cautions))
  const signalWord = worstSignalWord(all)
  if (!signalWord) return null
  const topics = [...new Set(all.map((caution) => caution.topic))]
  const lines = topics.flatMap((topic) => {
    const [worst, ...others] = all.filter((caution) => caution.topic === topic)
    if (!worst) return []
    const where = posts.filter((post) => post.cautions.some((caution) => caution.topic === topic)).map((post) => post.where)
    const text = [worst, ...others].map((caution) => caution.text).join(' ')
    return [{ code: worst.code, topic, signalWord: worst.signalWord, title: worst.title, text, where: [...new Set(where)] }]
  })
  return { signalWord, lines }
}

/** The most words an embedded line may have. */
export const EMBEDDED_WORDS = 12

/**
 * A post's own line: the worst signal word and, in at most 12 words, the short text of its worst caution when there is one topic,
 * else the topics' titles as far as they fit ("and 2 more" for the rest). Null when there is nothing to say.
 */
export function embeddedLine(cautions: readonly ShownCaution[]): { signalWord: SignalWord; text: string } | null {
  const [worst, ...others] = unionCautions([cautions])
  if (!worst) return null
  const titles = [worst, ...others.filter((caution) => caution.topic !== worst.topic)]
    .filter((caution, index, list) => list.findIndex((other) => other.topic === caution.topic) === index)
    .map((caution) => caution.title)
  return { signalWord: worst.signalWord, text: titles.length === 1 ? worst.short : joinTitles(titles) }
}

/** As many titles as fit, and how many more there are. */
function joinTitles(titles: readonly string[]): string {
  for (let shown = titles.length; shown > 0; shown -= 1) {
    const rest = titles.length - shown
    const text = titles.slice(0, shown).join(' · ') + (rest > 0 ? ` · and ${rest} more` : '')
    if (wordCount(text) <= EMBEDDED_WORDS) return text
  }
  return `${titles.length} cautions: read the plate`
}

/** Words of a line as a reader counts them: signs between words don't. */
export function wordCount(text: string): number {
  return text.split(/\s+/).filter((word) => /[\p{L}\p{N}]/u.test(word)).length
}
