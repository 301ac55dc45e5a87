// Turns the rule table's words into matchers, once a table. No judgement here: required-cautions.ts asks, this answers where.
import type { CautionRule, CautionRuleTable, Vocabulary, WordCondition } from './rule-table'
import { compileTerms, type TermHit, type TermMatcher } from './term-matcher'
import type { TradeText, TradeWord } from './trade-words'

/** The words that met a condition, a hit a group, or null. */
export type ConditionMatcher = (text: TradeText, memo: HitMemo) => TermHit[] | null
/** Hits of each word list, and of each group of lists, in one text: many rules ask for the same ones. */
export type HitMemo = Map<TermMatcher | Group, readonly TermHit[]>

export interface CompiledRule {
  rule: CautionRule
  hardware?: TermMatcher
  words?: ConditionMatcher
}

/** The lists whose hits count as one; the same terms give the same group, so that its hits are joined once a text. */
type Group = readonly TermMatcher[]
type GroupOf = (terms: readonly string[]) => Group

const DEFAULT_WITHIN = 12
const PLACING_REACH = 3
// No term of the table is longer in words, its gaps included.
const LONGEST_TERM = 16
const compiled = new WeakMap<CautionRuleTable, CompiledRule[]>()

/** The table's rules with their matchers. Throws on an unknown `@vocabulary`. */
export function compiledRules(table: CautionRuleTable): CompiledRule[] {
  const known = compiled.get(table)
  if (known) return known
  const placing = { loose: compileTerms(table.placing.loose), strict: compileTerms(table.placing.strict) }
  const vocabularies = new Map(Object.entries(table.vocabularies).map(([name, list]) => [name, vocabularyMatcher(list, placing)]))
  const groupOf = sharedGroups(vocabularies)
  const rules = table.rules.map((rule) => ({
    rule,
    ...(rule.hardware ? { hardware: compileTerms(rule.hardware) } : {}),
    ...(rule.words ? { words: conditionMatcher(rule.words, groupOf) } : {}),
  }))
  compiled.set(table, rules)
  return rules
}

function vocabularyMatcher(list: Vocabulary, placing: Record<'loose' | 'strict', TermMatcher>): TermMatcher {
  const find = compileTerms(list.words)
  const hide = compileTerms(list.not ?? [])
  return (text) => {
    const hidden = new Set<number>()
    for (const { first, last } of hide(text)) for (let index = first; index <= last; index += 1) hidden.add(index)
    const places = list.asSubject ? new Set(placing[list.asSubject](text).map((hit) => hit.last)) : new Set<number>()
    return find(text).filter((hit) => !hides(hidden, hit) && !placedBy(text.words, places, hit))
  }
}

function hides(hidden: ReadonlySet<number>, hit: TermHit): boolean {
  for (let index = hit.first; index <= hit.last; index += 1) if (hidden.has(index)) return true
  return false
}

/** "near the gear": a placing word ends at most three words before, in the same sentence. */
function placedBy(words: readonly TradeWord[], places: ReadonlySet<number>, hit: TermHit): boolean {
  for (let index = hit.first - 1; index >= hit.first - PLACING_REACH; index -= 1) {
    if (places.has(index) && words[index]?.sentence === words[hit.first]?.sentence) return true
  }
  return false
}

/** One group for each set of terms, however many rules write it down. */
function sharedGroups(vocabularies: Map<string, TermMatcher>): GroupOf {
  const groups = new Map<string, Group>()
  return (terms) => {
    const key = terms.join('\n')
    const group = groups.get(key) ?? groupMatchers(terms, vocabularies)
    groups.set(key, group)
    return group
  }
}

/** A group's matchers: its own terms and the vocabularies it names. */
function groupMatchers(terms: readonly string[], vocabularies: Map<string, TermMatcher>): Group {
  const own = terms.filter((term) => !term.startsWith('@'))
  const named = terms.filter((term) => term.startsWith('@')).map((term) => {
    const matcher = vocabularies.get(term.slice(1))
    if (!matcher) throw new Error(`caution rules name an unknown vocabulary: ${term}`)
    return matcher
  })
  return own.length > 0 ? [compileTerms(own), ...named] : named
}

function conditionMatcher(condition: WordCondition, groupOf: GroupOf): ConditionMatcher {
  const groups = condition.all.map(groupOf)
  const unless = groupOf(condition.unless ?? [])
  const within = condition.within ?? DEFAULT_WITHIN
  return (text, memo) => {
    const { words } = text
    const hits: (readonly TermHit[])[] = []
    for (const group of groups) {
      const found = hitsOf(group, text, memo)
      // Most rules end here: nothing of the group stands in the text.
      if (found.length === 0) return null
      hits.push(found)
    }
    const [anchors = [], ...others] = hits
    const against = hitsOf(unless, text, memo)
    for (const anchor of anchors) {
      if (nearest(words, against, anchor, within)) continue
      const met = others.map((list) => nearest(words, list, anchor, within))
      if (met.every((hit) => hit !== undefined)) return [anchor, ...met]
    }
    return null
  }
}

/** A group's hits in text order. */
function hitsOf(group: Group, text: TradeText, memo: HitMemo): readonly TermHit[] {
  const known = memo.get(group)
  if (known) return known
  const lists = group.map((matcher) => {
    const hits = memo.get(matcher) ?? matcher(text)
    memo.set(matcher, hits)
    return hits
  }).filter((hits) => hits.length > 0)
  const [only = []] = lists
  const joined = lists.length < 2 ? only : lists.flat().sort((x, y) => x.first - y.first)
  memo.set(group, joined)
  return joined
}

/** The first hit at most `within` words from the anchor that shares no word with it. Binary search: texts repeat themselves. */
function nearest(words: readonly TradeWord[], hits: readonly TermHit[], anchor: TermHit, within: number): TermHit | undefined {
  const from = (words[anchor.first]?.position ?? 0) - within - LONGEST_TERM
  let low = 0
  let high = hits.length
  while (low < high) {
    const middle = (low + high) >> 1
    if ((words[hits[middle]?.first ?? 0]?.position ?? 0) < from) low = middle + 1
    else high = middle
  }
  for (let index = low; index < hits.length; index += 1) {
    const hit = hits[index]
    if (!hit || (hit.first > anchor.last && distance(words, anchor, hit) > within)) return undefined
    const apart = hit.last < anchor.first || hit.first > anchor.last
    if (apart && distance(words, anchor, hit) <= within) return hit
  }
  return undefined
}

/** Steps from the end of the earlier hit to the start of the later. */
function distance(words: readonly TradeWord[], a: TermHit, b: TermHit): number {
  const [early, late] = a.first <= b.first ? [a, b] : [b, a]
  return (words[late.first]?.position ?? 0) - (words[early.last]?.position ?? 0)
}
