// Which tasks a few words name: by title, by the title of the operation, by stem and by trade synonym.
// "deburring" names every deburring task, "deburr the holes" only that one.
import { analyseText } from './analyse-text'
import { readOrderSides } from './order-question'
import type { Synonyms } from './synonyms'

export interface TaskName {
  slug: string
  title: string
  /** Title of its operation. */
  operation: string
}

/** Two sets of task slugs that have none in common. */
export interface OrderQuestion { one: ReadonlySet<string>; other: ReadonlySet<string> }

interface Name {
  slug: string
  /** Each has to be named, by any of its spellings. */
  words: readonly (readonly string[])[]
  /** Groups that say the whole name. */
  groups: readonly string[]
}

export class TaskNames {
  private readonly names = new Map<string, { names: Name[]; uses: number }>()

  constructor(private readonly synonyms: Synonyms) {}

  add(task: TaskName): void {
    const known = this.names.get(task.slug) ?? { names: [task.title, task.operation].map((title) => this.nameOf(task.slug, title)), uses: 0 }
    known.uses++
    this.names.set(task.slug, known)
  }

  remove(slug: string): void {
    const known = this.names.get(slug)
    if (known && --known.uses <= 0) this.names.delete(slug)
  }

  /** Reads `text` as a question of order between tasks that are known here; null when it is none. */
  read(text: string): OrderQuestion | null {
    if (this.names.size === 0) return null
    for (const { left, right } of readOrderSides(text)) {
      const [one, other] = apart(this.find(left), this.find(right))
      if (one.size > 0 && other.size > 0) return { one, other }
    }
    return null
  }

  /** Slugs of the tasks named most exactly. */
  private find(text: string): Set<string> {
    const { tokens } = analyseText(text)
    const said = new Set([...tokens.flatMap((token) => [token.term, ...token.also]), ...this.synonyms.widenQuery(tokens).flatMap((match) => match.terms)])
    let best = 1
    let found = new Set<string>()
    for (const { names } of this.names.values()) {
      for (const { slug, words, groups } of names) {
        if (words.length < best || !(words.every((spellings) => spellings.some((term) => said.has(term))) || groups.some((group) => said.has(group)))) continue
        if (words.length > best) found = new Set()
        best = words.length
        found.add(slug)
      }
    }
    return found
  }

  private nameOf(slug: string, title: string): Name {
    const { tokens } = analyseText(title)
    const labels = this.synonyms.labelText(tokens)
    const whole = labels.filter(({ first, last }) => first === 0 && last === tokens.length - 1)
    return { slug, words: tokens.map((token, place) => [token.term, ...labels.filter(({ first, last }) => first === place && last === place).flatMap((match) => match.terms)]), groups: whole.flatMap((match) => match.terms) }
  }
}

/** What one side names more exactly is taken from the other: in "deburr before deburring edges" the first is about holes. */
function apart(left: Set<string>, right: Set<string>): [Set<string>, Set<string>] {
  const without = (set: Set<string>, other: Set<string>) => new Set([...set].filter((slug) => !other.has(slug)))
  if (left.size > right.size) return [without(left, right), right]
  if (right.size > left.size) return [left, without(right, left)]
  return [without(left, right), without(right, left)]
}

/** Whether advice is about the pair in question, whichever way round. */
export function isAbout({ before, after }: { before: string; after: string }, { one, other }: OrderQuestion): boolean {
  return (one.has(before) && other.has(after)) || (one.has(after) && other.has(before))
}
