// Trade synonyms as terms of their own: where a phrase of a group stands in a text, the group's term stands there too.
// So a phrase finds another phrase, word order and all, at the price of one lookup. The list itself is content/synonyms.json.
import { analyseText, type Token } from './analyse-text'

export interface SynonymList {
  /** Each group: any of its phrases finds any other. */
  twoWay: readonly (readonly string[])[]
  /** `from` finds `to`, never the other way round. */
  oneWay: readonly { from: string; to: readonly string[] }[]
}

/** A phrase found in tokens `first` … `last`, and the terms of its groups. */
export interface PhraseMatch { first: number; last: number; terms: string[] }

interface Phrase { rest: readonly string[]; terms: string[] }
type Lexicon = Map<string, Phrase[]>

/** Marks terms of groups; no text can hold it, so no word can be mistaken for one. */
export const groupMark = '≈'

export class Synonyms {
  /** What a text is labelled with. */
  private readonly inText: Lexicon = new Map()
  /** What a question is widened by: the same groups, and the one-way ones by their left side. */
  private readonly inQuery: Lexicon = new Map()

  private readonly phrases = new Map<string, readonly string[]>()

  constructor(list: SynonymList) {
    list.twoWay.forEach((group, index) => this.addGroup(group, `${groupMark}${index}`))
    list.oneWay.forEach(({ from, to }, index) => this.addOneWay(from, to, `${groupMark}o${index}`))
  }

  /** Group terms of a text, once for every place. */
  labelText(tokens: readonly Token[]): PhraseMatch[] {
    return matchAll(this.inText, tokens)
  }

  /** The phrases a group's term stands for; empty for other terms. */
  phrasesOf(term: string): readonly string[] {
    return this.phrases.get(term) ?? []
  }

  /** Phrases of a question, longest first and without overlaps: in "drill stop", "drill" is not widened by itself. */
  widenQuery(tokens: readonly Token[]): PhraseMatch[] {
    const all = matchAll(this.inQuery, tokens).sort((a, b) => (b.last - b.first) - (a.last - a.first) || a.first - b.first)
    const chosen: PhraseMatch[] = []
    for (const match of all) {
      const same = chosen.find((c) => c.first === match.first && c.last === match.last)
      if (same) same.terms = [...new Set([...same.terms, ...match.terms])]
      else if (chosen.every((c) => match.last < c.first || match.first > c.last)) chosen.push({ ...match, terms: [...match.terms] })
    }
    return chosen
  }

  private addGroup(group: readonly string[], term: string): void {
    const phrases = new Map(group.map(phraseTerms).filter((p) => p !== null).map((p) => [p.join(' '), p] as const))
    // A group whose phrases all stem to the same word says nothing that stemming has not said.
    if (phrases.size < 2) return
    this.phrases.set(term, group)
    for (const phrase of phrases.values()) {
      addTo(this.inText, phrase, [term])
      addTo(this.inQuery, phrase, [term])
    }
  }

  private addOneWay(from: string, to: readonly string[], ownTerm: string): void {
    const source = phraseTerms(from)
    if (!source) return
    const terms = new Set<string>()
    for (const target of to.map(phraseTerms)) {
      if (!target) continue
      const groups = groupsOf(this.inText, target)
      if (groups.length === 0) {
        addTo(this.inText, target, [ownTerm])
        this.phrases.set(ownTerm, to)
      }
      for (const term of groups.length > 0 ? groups : [ownTerm]) terms.add(term)
    }
    addTo(this.inQuery, source, [...terms])
  }
}

/** Terms of a phrase, or null when nothing searchable stands in it, or one word only remains of several ("to follow"). */
function phraseTerms(phrase: string): string[] | null {
  const terms = analyseText(phrase).tokens.map((token) => token.term)
  if (terms.length === 0 || (terms.length === 1 && /\s/.test(phrase.trim()))) return null
  return terms
}

function addTo(lexicon: Lexicon, phrase: readonly string[], terms: string[]): void {
  const [first, ...rest] = phrase
  if (first === undefined) return
  const list = lexicon.get(first) ?? []
  const known = list.find((p) => p.rest.length === rest.length && p.rest.every((t, i) => t === rest[i]))
  if (known) known.terms.push(...terms.filter((term) => !known.terms.includes(term)))
  else list.push({ rest, terms: [...terms] })
  lexicon.set(first, list)
}

function groupsOf(lexicon: Lexicon, phrase: readonly string[]): string[] {
  const [first = '', ...rest] = phrase
  const known = lexicon.get(first)?.find((p) => p.rest.length === rest.length && p.rest.every((t, i) => t === rest[i]))
  return known?.terms.filter((term) => !term.startsWith(`${groupMark}o`)) ?? []
}

function matchAll(lexicon: Lexicon, tokens: readonly Token[]): PhraseMatch[] {
  const matches: PhraseMatch[] = []
  tokens.forEach((token, first) => {
    for (const term of [token.term, ...token.also]) {
      for (const phrase of lexicon.get(term) ?? []) {
        const fits = phrase.rest.every((t, i) => { const at = tokens[first + 1 + i]; return at !== undefined && (at.term === t || at.also.includes(t)) })
        if (fits) matches.push({ first, last: first + phrase.rest.length, terms: phrase.terms })
      }
    }
  })
  return matches
}
