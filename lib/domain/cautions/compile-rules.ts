// Turns the rule table's words into matchers, once a table. No judgement here: required-cautions.ts asks, this answers where.
import type { CautionRule, CautionRuleTable, Vocabulary, WordCondition } from './rule-table'
import { compileTerms, type TermHit, type TermMatcher } from './term-matcher'
import type { TradeWord } from './trade-words'

/** The words that met a condition, a hit a group, or null. */
export type ConditionMatcher = (words: readonly TradeWord[], memo: HitMemo) => TermHit[] | null
/** Hits of each word list in one text: several rules ask for the same list. */
export type HitMemo = Map<TermMatcher, TermHit[]>

export interface CompiledRule {
  rule: CautionRule
  hardware?: TermMatcher
  words?: ConditionMatcher
}

const DEFAULT_WITHIN = 12
const PLACING_REACH = 3
const compiled = new WeakMap<CautionRuleTable, CompiledRule[]>()

/** The table's rules with their matchers. Throws on an unknown `@vocabulary`. */
export function compiledRules(table: CautionRuleTable): CompiledRule[] {
  const known = compiled.get(table)
  if (known) return known
  const placing = compileTerms(table.placing)
  const vocabularies = new Map(Object.entries(table.vocabularies).map(([name, list]) => [name, vocabularyMatcher(list, placing)]))
  const rules = table.rules.map((rule) => ({
    rule,
    ...(rule.hardware ? { hardware: compileTerms(rule.hardware) } : {}),
    ...(rule.words ? { words: conditionMatcher(rule.words, vocabularies) } : {}),
  }))
  compiled.set(table, rules)
  return rules
}

function vocabularyMatcher(list: Vocabulary, placing: TermMatcher): TermMatcher {
  const find = compileTerms(list.words)
  const hide = compileTerms(list.not ?? [])
  return (words) => {
    const hidden = hide(words)
    const places = list.asSubject ? placing(words) : []
    return find(words).filter((hit) => !hidden.some((mask) => covers(mask, hit)) && !places.some((place) => placedBy(words, place, hit)))
  }
}

function covers(mask: TermHit, hit: TermHit): boolean {
  return mask.first <= hit.last && hit.first <= mask.last
}

/** "near the gear": the placing word stands at most three words before, in the same sentence. */
function placedBy(words: readonly TradeWord[], place: TermHit, hit: TermHit): boolean {
  const distance = hit.first - place.last
  return distance > 0 && distance <= PLACING_REACH && words[place.last]?.sentence === words[hit.first]?.sentence
}

/** A group's hits: its own terms and those of the vocabularies it names, in text order. */
function groupMatcher(terms: readonly string[], vocabularies: Map<string, TermMatcher>): TermMatcher[] {
  const own = terms.filter((term) => !term.startsWith('@'))
  const named = terms.filter((term) => term.startsWith('@')).map((term) => {
    const matcher = vocabularies.get(term.slice(1))
    if (!matcher) throw new Error(`caution rules name an unknown vocabulary: ${term}`)
    return matcher
  })
  return own.length > 0 ? [compileTerms(own), ...named] : named
}

function conditionMatcher(condition: WordCondition, vocabularies: Map<string, TermMatcher>): ConditionMatcher {
  const groups = condition.all.map((terms) => groupMatcher(terms, vocabularies))
  const unless = groupMatcher(condition.unless ?? [], vocabularies)
  const within = condition.within ?? DEFAULT_WITHIN
  return (words, memo) => {
    const hits = groups.map((group) => hitsOf(group, words, memo))
    const [anchors, ...others] = hits
    if (!anchors || hits.some((list) => list.length === 0)) return null
    const against = hitsOf(unless, words, memo)
    for (const anchor of anchors) {
      if (against.some((hit) => distance(words, anchor, hit) <= within)) continue
      const met = others.map((list) => list.find((hit) => distance(words, anchor, hit) <= within && !same(hit, anchor)))
      if (met.every((hit) => hit !== undefined)) return [anchor, ...met]
    }
    return null
  }
}

function hitsOf(group: readonly TermMatcher[], words: readonly TradeWord[], memo: HitMemo): TermHit[] {
  return group.flatMap((matcher) => {
    const hits = memo.get(matcher) ?? matcher(words)
    memo.set(matcher, hits)
    return hits
  })
}

function same(a: TermHit, b: TermHit): boolean {
  return a.first === b.first && a.last === b.last
}

/** Words between two hits, 0 when they touch or overlap. */
function distance(words: readonly TradeWord[], a: TermHit, b: TermHit): number {
  const [early, late] = a.first <= b.first ? [a, b] : [b, a]
  return Math.max(0, (words[late.first]?.position ?? 0) - (words[early.last]?.position ?? 0))
}
