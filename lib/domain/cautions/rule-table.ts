// The shape of the caution rule table: cautions, the word lists that recognise trade text, and the rules that join them.
// The table itself is data (content/cautions.json); matching lives beside this file.

/** Signal words of ANSI Z535.6, worst first. */
export const SIGNAL_WORDS = ['WARNING', 'CAUTION', 'NOTICE'] as const
export type SignalWord = (typeof SIGNAL_WORDS)[number]

/** Topics of the critical systems: a post that carries one needs two stamps. */
export const CRITICAL_TOPICS = [
  'structure', 'flight-controls', 'fuel', 'brakes', 'landing-gear', 'restraint', 'powerplant', 'doors', 'pitot-static',
] as const
export type CriticalTopic = (typeof CRITICAL_TOPICS)[number]

/** Topics of the workshop: what can hurt the person doing the work. */
export const SHOP_TOPICS = ['eyes', 'hearing', 'breathing', 'skin', 'sharp-edges', 'fire', 'electrical', 'pinch'] as const

export const CAUTION_TOPICS = [...CRITICAL_TOPICS, ...SHOP_TOPICS] as const
export type CautionTopic = (typeof CAUTION_TOPICS)[number]

/** One caution as the shop reads it. `short` is the embedded form: at most 12 words. */
export interface CautionDefinition {
  code: string
  signalWord: SignalWord
  topic: CautionTopic
  title: string
  text: string
  short: string
  twoStamps: boolean
}

/**
 * A named list of terms. A term is one or more words in a row, matched by stem and in any case:
 * `a/b` either word · `=word` this form only · `word*` any word that begins so · `_` exactly one word · `..` up to three words, or none.
 * `not` lists phrases that hide a term standing inside them ("bending brake" is no brake).
 * `asSubject`: a term that only says where something lies doesn't count: 'loose' "near the gear", 'strict' also "on the gear", "to the gear".
 */
export interface Vocabulary {
  words: string[]
  not?: string[]
  asSubject?: 'loose' | 'strict'
}

/** Terms that must stand together: each group of `all` (terms or `@vocabulary`) within `within` words of the first group's term. */
export interface WordCondition {
  all: string[][]
  /** Distance in words; 12 when left out. The end of a sentence counts as a few words more. */
  within?: number
  /** Terms that switch off a first-group term they stand near to. */
  unless?: string[]
}

/** A rule asks for its caution when every dimension it names is met; inside a dimension any one value is enough. */
export interface CautionRule {
  code: string
  operations?: string[]
  tasks?: string[]
  /** Prefixes of JASC codes, for systems that are not critical. */
  jasc?: string[]
  /** A critical system, by `topicsOfSystem`. */
  system?: CriticalTopic
  /** Terms, as in a vocabulary, looked for in the hardware list. */
  hardware?: string[]
  words?: WordCondition
}

export interface CautionRuleTable {
  version: number
  cautions: CautionDefinition[]
  vocabularies: Record<string, Vocabulary>
  /** Words that make what follows a place and not the thing worked on: near, beside, past …; strict adds on, under, to … */
  placing: { loose: string[]; strict: string[] }
  rules: CautionRule[]
}

/** What is judged: text and slugs of one post. An answer's subject holds its question's slugs and the words of both. */
export interface CautionSubject {
  title?: string
  text: string
  operations: string[]
  tasks: string[]
  hardware: string[]
  jasc: string[]
}

/** A caution the rules ask for, with the reason in plain words. */
export interface RequiredCaution extends CautionDefinition {
  because: string
}
