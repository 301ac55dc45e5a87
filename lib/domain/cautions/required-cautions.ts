// Which cautions a post must carry: operations × tasks × systems × hardware × words against the rule table. Pure.
import { compiledRules, type CompiledRule, type HitMemo } from './compile-rules'
import { topicsOfSystem } from './critical-systems'
import { SIGNAL_WORDS, type CautionRuleTable, type CautionSubject, type RequiredCaution } from './rule-table'
import type { TermHit } from './term-matcher'
import { readTrade, type TradeText } from './trade-words'

interface ReadText {
  text: string
  trade: TradeText
  memo: HitMemo
}

/**
 * The cautions the rules ask for, each code once, with why in plain words: WARNING first, then CAUTION, NOTICE, then in table order.
 * Never throws on a text. Adding an operation, task, system or piece of hardware never removes a caution.
 */
export function requiredCautions(table: CautionRuleTable, subject: CautionSubject): RequiredCaution[] {
  const text = read(subject.title ? `${subject.title}\n\n${subject.text}` : subject.text)
  // Hardware arrives as slugs or plain names: both read as words.
  const hardware = read(subject.hardware.map((name) => name.replaceAll('-', ' ')).join('\n\n'))
  const because = new Map<string, string>()
  for (const compiledRule of compiledRules(table)) {
    if (because.has(compiledRule.rule.code)) continue
    const reason = reasonOf(compiledRule, subject, text, hardware)
    if (reason) because.set(compiledRule.rule.code, reason)
  }
  return table.cautions
    .flatMap((caution) => {
      const reason = because.get(caution.code)
      return reason ? [{ ...caution, because: reason }] : []
    })
    .sort((a, b) => SIGNAL_WORDS.indexOf(a.signalWord) - SIGNAL_WORDS.indexOf(b.signalWord))
}

function read(text: string): ReadText {
  return { text, trade: readTrade(text), memo: new Map() }
}

/** Why a rule holds for the subject, or null: every dimension the rule names must be met. */
function reasonOf(compiledRule: CompiledRule, subject: CautionSubject, text: ReadText, hardware: ReadText): string | null {
  const { rule } = compiledRule
  const reasons: (string | null)[] = []
  if (rule.operations) reasons.push(named('operation', rule.operations, subject.operations))
  if (rule.tasks) reasons.push(named('task', rule.tasks, subject.tasks))
  if (rule.jasc) reasons.push(system(subject.jasc, (code) => (rule.jasc ?? []).some((prefix) => code.startsWith(prefix))))
  if (rule.system) reasons.push(system(subject.jasc, (code) => topicsOfSystem(code).some((topic) => topic === rule.system)))
  if (compiledRule.hardware) reasons.push(quoted('hardware', hardware, compiledRule.hardware(hardware.trade).slice(0, 1)))
  if (compiledRule.words) reasons.push(quoted('the words', text, compiledRule.words(text.trade, text.memo) ?? []))
  if (reasons.length === 0 || reasons.some((reason) => reason === null)) return null
  return reasons.join(' with ')
}

function named(label: string, wanted: readonly string[], present: readonly string[]): string | null {
  // In the rule's order, so the reason doesn't depend on the order of the post's operations.
  const found = wanted.find((slug) => present.includes(slug))
  return found ? `${label} ${found.replaceAll('-', ' ')}` : null
}

function system(codes: readonly string[], matches: (code: string) => boolean): string | null {
  const found = [...codes].sort().find(matches)
  return found ? `section system ${found}` : null
}

/** The author's own words, in text order, each once. */
function quoted(label: string, { text, trade }: ReadText, hits: readonly TermHit[]): string | null {
  if (hits.length === 0) return null
  const phrases = [...hits]
    .sort((a, b) => a.first - b.first)
    .map(({ first, last }) => text.slice(trade.words[first]?.start, trade.words[last]?.end).replace(/\s+/g, ' '))
  return `${label} ${[...new Set(phrases)].map((phrase) => `“${phrase}”`).join(' and ')}`
}
