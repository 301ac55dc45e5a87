// The index itself: postings, titles and the words of the corpus side by side, and the order of what they find.
// Lives in the worker thread; knows entries only as SearchDocuments.
import 'server-only'
import { leastCoverage } from '@/lib/domain/search/least-coverage'
import { understandQuery, type Concept, type Corpus, type UnderstoodQuery } from '@/lib/domain/search/understand-query'
import { Synonyms, type SynonymList } from '@/lib/domain/search/synonyms'
import { Vocabulary } from '@/lib/domain/search/vocabulary'
import { searchWeights, type SearchWeights } from '@/lib/domain/search/weights'
import { entryWeight } from '@/lib/domain/search/entry-weight'
import { TaskNames } from '@/lib/domain/search/task-names'
import { AskedDirectly } from './asked-directly'
import { countTerms, termsOfDocument } from './document-terms'
import { feedbackQuestion } from './feedback-question'
import { explainHits } from './explain-hits'
import type { SearchExplanation } from './explanation'
import { findPassage } from './find-passage'
import { HeldTerms } from './held-terms'
import type { SearchAnswer, SearchDocument, SearchFilters, SearchRequest, WhenOrdered } from './messages'
import { packDocument, unpackDocument, type PackedDocument } from './packed-document'
import type { PostingList } from './posting-list'
import { Postings } from './postings'
import { Question } from './question'
import { PlacedTermsOfTexts } from './placed-terms'
import { TitleIndex } from './title-index'

const mostConcepts = 24
const mostConceptsOfSimilar = 12
const leastCoverageOfSimilar = 0.25
/** Entries far below the best one only share a common word with the question. */
const leastShareOfBest = 0.25
/** Of more entries than this only those that hold most of the question are scored, of equals those with the best evidence; the rest follow by what they hold. */
const mostScored = 1_000
/** A whole title holds so many terms that few entries share the same part of it: fewer are enough to find the nearest. */
const mostScoredOfSimilar = 300
/** Postings read for one question; the commonest words are left out beyond it, so that no text takes long. */
const mostPostings = 120_000

/** The postings know an entry by its slot, a small number used again after the entry is gone: bits are kept by it. */
interface Kept { slot: number; document: PackedDocument; weight: number }
/** `shared`: the part of the score that comes from what the first hits share. */
interface Scored { kept: Kept; coverage: number; score: number; shared: number }
interface Wanted { filters: SearchFilters; least: number; mostScored: number; wanted: number }
interface Asked { question: Question; direct: AskedDirectly }
/** `considered` hold a word of the question; those that hold less than `cutBelow` of it are not among `found`. */
interface Ranked { found: Scored[]; held: HeldTerms; best: number; cutBelow: number; considered: number }
interface Looked extends Asked { understood: UnderstoodQuery; tooCommon: string[]; least: number; ranked: Ranked }
/** What a snapshot keeps of an entry. */
export interface IndexRecord { document: PackedDocument; terms: ReadonlyMap<string, number>; words: ReadonlySet<string> }
type Found = Pick<SearchAnswer, 'hits' | 'total' | 'ignored' | 'didYouMean'>

export class SearchIndex {
  private readonly postings: Postings
  private readonly kept = new Map<number, Kept>()
  private readonly slots: (Kept | undefined)[] = []
  private readonly freeSlots: number[] = []
  private readonly vocabulary = new Vocabulary()
  private readonly titles = new TitleIndex()
  private readonly synonyms: Synonyms
  private readonly placed: PlacedTermsOfTexts
  private readonly tasks: TaskNames

  constructor(synonyms: SynonymList, private readonly weights: SearchWeights = searchWeights) {
    this.postings = new Postings(weights.bm25)
    this.synonyms = new Synonyms(synonyms)
    this.placed = new PlacedTermsOfTexts(this.synonyms)
    this.tasks = new TaskNames(this.synonyms)
  }

  get documents(): number {
    return this.kept.size
  }

  /** Bytes kept outside the heap, nearly. */
  get bytes(): number {
    let sum = this.postings.bytes
    for (const { document } of this.kept.values()) sum += document.texts.byteLength
    return sum
  }

  /** Adds an entry or puts its new text in place of the old. */
  put(document: SearchDocument): void {
    this.remove(document.id)
    const { all, words } = termsOfDocument(document, this.synonyms, this.weights.titleRepeats)
    const { slot } = this.keep(packDocument(document))
    this.postings.add(slot, countTerms(all))
    for (const word of words) this.vocabulary.add(word)
  }

  /** Takes an entry out; nothing happens when it is not in. */
  remove(id: number): void {
    const old = this.kept.get(id)
    if (!old) return
    const { all, words } = termsOfDocument(unpackDocument(old.document), this.synonyms, this.weights.titleRepeats)
    for (const word of words) this.vocabulary.remove(word)
    this.postings.remove(old.slot, new Set(all))
    this.slots[old.slot] = undefined
    this.freeSlots.push(old.slot)
    this.titles.remove(id)
    this.kept.delete(id)
    for (const { before, after } of old.document.orderAdvice ?? []) for (const { slug } of [before, after]) this.tasks.remove(slug)
  }

  /** Ids of all entries, in the order in which a snapshot keeps them. */
  ids(): number[] {
    return [...this.kept.keys()]
  }

  /** An entry with its terms, as a snapshot keeps it; null when it is not in. */
  record(id: number): IndexRecord | null {
    const kept = this.kept.get(id)
    if (!kept) return null
    const { all, words } = termsOfDocument(unpackDocument(kept.document), this.synonyms, this.weights.titleRepeats)
    return { document: kept.document, terms: countTerms(all), words }
  }

  /** Puts in an entry whose terms are known; `terms` holds a list and a count each. Only for an index that is being filled, once an entry. */
  restore(document: PackedDocument, terms: Iterable<readonly [PostingList, number]>): void {
    const { slot } = this.keep(document)
    let different = 0
    for (const [list, count] of terms) {
      list.put(slot, count)
      different++
    }
    this.postings.noteLength(slot, different)
  }

  /** The list of `term`, to restore with. */
  listOf(term: string): PostingList {
    return this.postings.listOf(term)
  }

  restoreWord(word: string, documents: number): void {
    this.vocabulary.add(word, documents)
  }

  search(request: SearchRequest, whenOrdered?: WhenOrdered): Found {
    const looked = this.look(request)
    const { understood: { ignored, didYouMean }, ranked: { found }, tooCommon } = looked
    const page = found.slice(request.offset, request.offset + request.limit)
    whenOrdered?.(page.map(({ kept }) => kept.document.id))
    return {
      hits: page.map((scored) => this.hit(scored, looked)),
      total: found.length,
      ignored: [...ignored, ...tooCommon],
      // A spelling under which nothing is found either helps nobody.
      didYouMean: found.length > 0 ? didYouMean : null,
    }
  }

  /** The same search, told instead of shown. */
  explain(request: SearchRequest): SearchExplanation {
    const { understood, tooCommon, ...looked } = this.look(request)
    const page = looked.ranked.found.slice(request.offset, request.offset + request.limit)
    return {
      ...explainHits(page.map((hit) => ({ ...hit, kept: { ...hit.kept, document: unpackDocument(hit.kept.document) } })), { ...looked, ...looked.ranked, postings: this.postings, placed: this.placed, synonyms: this.synonyms, frequency: this.corpus().frequency }),
      documents: this.kept.size, ignored: [...understood.ignored, ...tooCommon], didYouMean: understood.didYouMean, places: understood.places,
    }
  }

  similar(text: string, filters: SearchFilters, limit: number): SearchAnswer['hits'] {
    const { concepts } = understandQuery(text, this.corpus(), { mostConcepts: mostConceptsOfSimilar, completeLast: false, correct: false })
    const question = new Question(this.afford(concepts.filter((concept) => concept.routes.length > 0)).affordable)
    const asked = { question, direct: new AskedDirectly(question, [], null) }
    return this.rank(asked, { filters, least: leastCoverageOfSimilar, mostScored: mostScoredOfSimilar, wanted: limit }).found.slice(0, limit).map((scored) => this.hit(scored, asked))
  }

  suggest(text: string, limit: number): { id: number; title: string }[] {
    return this.titles.complete(text, limit).flatMap((id) => {
      const title = this.kept.get(id)?.document.title
      return title === undefined ? [] : [{ id, title }]
    })
  }

  /** Orders the best anew by what they share: a long question means words that it does not say. */
  private orderByFeedback(found: Scored[], question: Question): Scored[] {
    const { feedback } = this.weights
    const first = found.slice(0, feedback.entries).map(({ kept, score }) => ({ score, terms: termsOfDocument(unpackDocument(kept.document), this.synonyms, 1).all }))
    const further = feedbackQuestion(first, question, this.corpus(), feedback)
    if (!further) return found
    const best = found.slice(0, mostScored)
    const chosen = new Uint8Array(this.slots.length)
    for (const { kept } of best) chosen[kept.slot] = 1
    const scores = this.postings.score(further, new HeldTerms(further.terms.length, 0), chosen)
    for (const entry of best) {
      entry.shared = (scores[entry.kept.slot] ?? 0) * entry.kept.weight
      entry.score += entry.shared
    }
    const [top, ...others] = best
    if (!top) return found
    others.sort(byScore)
    // What others share says nothing against the best answer: it stays first (measured: one question in fifty lost it).
    const lift = Math.max(0, (others[0]?.score ?? 0) - top.score)
    top.shared += lift
    top.score += lift
    return [top, ...others, ...found.slice(mostScored)]
  }

  /** What both `search` and `explain` see. */
  private look({ text, filters, limit, offset }: SearchRequest): Looked {
    const understood = understandQuery(text, this.corpus(), { mostConcepts, completeLast: true, correct: true })
    const { affordable, tooCommon } = this.afford(understood.concepts)
    const question = new Question(affordable)
    const order = this.tasks.read(understood.didYouMean ?? text)
    const direct = new AskedDirectly(question, understood.places, order)
    const least = leastCoverage(affordable.length, this.weights.coverage)
    const ranked = this.rank({ question, direct }, { filters, least, mostScored, wanted: offset + limit })
    // A question that names its step or its two tasks says what it means; what hits share would blur it.
    if (affordable.length >= this.weights.feedback.concepts && !direct.matters) ranked.found = this.orderByFeedback(ranked.found, question)
    return { understood, tooCommon, question, direct, least, ranked }
  }

  private corpus(): Corpus {
    return { documents: this.kept.size, frequency: (term) => this.postings.frequency(term), vocabulary: this.vocabulary, synonyms: this.synonyms, factor: this.weights.factor }
  }

  private keep(document: PackedDocument): Kept {
    const kept = { slot: this.freeSlots.pop() ?? this.slots.length, document, weight: entryWeight(document) }
    this.kept.set(document.id, kept)
    this.slots[kept.slot] = kept
    this.titles.put(document.id, document.title)
    for (const { before, after } of document.orderAdvice ?? []) for (const task of [before, after]) this.tasks.add(task)
    return kept
  }

  /** Keeps the rarest concepts whose postings can be read in time. */
  private afford(concepts: readonly Concept[]): { affordable: Concept[]; tooCommon: string[] } {
    const affordable = new Set<Concept>()
    let postings = 0
    for (const concept of [...concepts].sort((a, b) => b.mass - a.mass)) {
      postings += concept.routes.reduce((sum, r) => sum + r.terms.reduce((n, term) => n + this.postings.frequency(term), 0), 0)
      if (affordable.size === 0 || postings <= mostPostings) affordable.add(concept)
    }
    return { affordable: concepts.filter((c) => affordable.has(c)), tooCommon: concepts.filter((c) => !affordable.has(c)).map((c) => c.word) }
  }

  /** All that is found, the first `wanted` in order: best first, newest of equals first. Empty when even the best holds less than `least` of the question. */
  private rank(asked: Asked, { filters, least, mostScored: most, wanted }: Wanted): Ranked {
    const { question } = asked
    const held = this.postings.findHeld(question, this.slots.length)
    const coverageAt = this.coverages(question, held)
    const near: Scored[] = []
    let [best, considered] = [0, 0]
    for (const slot of held.slots) {
      const kept = this.slots[slot]
      if (!kept || kept.weight === 0 || !passes(kept.document, filters)) continue
      considered++
      const coverage = coverageAt(slot)
      if (coverage > best) best = coverage
      if (coverage >= best * leastShareOfBest) near.push({ kept, coverage, score: 0, shared: 0 })
    }
    const cutBelow = best * leastShareOfBest
    const found = best === 0 || best < least ? [] : this.order(near.filter(({ coverage }) => coverage >= cutBelow), asked, held, { most, wanted })
    return { found, held, best, cutBelow, considered }
  }

  /** Thousands of entries hold the same few terms of a question: each set of terms is weighed once. */
  private coverages(question: Question, held: HeldTerms): (slot: number) => number {
    const known = new Map<number, number>()
    return (slot) => {
      const pattern = held.pattern(slot)
      if (pattern === null) return question.coverage(held.at(slot))
      const seen = known.get(pattern)
      if (seen !== undefined) return seen
      const coverage = question.coverage(held.at(slot))
      known.set(pattern, coverage)
      return coverage
    }
  }

  /** The formula: score = BM25 (of the held terms, each by its routes) × evidence of the entry × directness. */
  private order(found: readonly Scored[], asked: Asked, held: HeldTerms, { most, wanted }: { most: number; wanted: number }): Scored[] {
    const { question, direct } = asked
    const worth = ({ slot, document, weight }: Kept) => (direct.matters ? weight * direct.factor(document, held.at(slot)) : weight)
    const scores = this.postings.score(question, held, this.choose(found, most, worth))
    const [scored, others]: [Scored[], Scored[]] = [[], []]
    let lowest = Infinity
    for (const entry of found) {
      entry.score = (scores[entry.kept.slot] ?? 0) * worth(entry.kept)
      if (entry.score > 0 && entry.score < lowest) lowest = entry.score
      ;(entry.score > 0 ? scored : others).push(entry)
    }
    for (const entry of others) entry.score = lowest * entry.coverage
    scored.sort(byScore)
    // Those that were not scored stand behind all that were; sorting thousands of them is only worth it for who turns that far.
    return scored.concat(wanted > scored.length ? others.sort(byScore) : others)
  }

  /** Marks the slots of at most `most` entries. */
  private choose(found: readonly Scored[], most: number, worth: (kept: Kept) => number): Uint8Array {
    const chosen = new Uint8Array(this.slots.length)
    // Worth decides only between equals: it is a small number, and coverages differ by far more than a millionth.
    const promise = ({ coverage, kept }: Scored) => coverage + worth(kept) * 1e-6
    const cut = found.length <= most ? -1 : nthLargest(found.map(promise), most)
    let room = most
    for (const entry of found) if (promise(entry) > cut) { chosen[entry.kept.slot] = 1; room-- }
    for (const entry of found) if (room > 0 && promise(entry) === cut) { chosen[entry.kept.slot] = 1; room-- }
    return chosen
  }

  private hit({ kept: { document }, score }: Scored, { question, direct }: Asked): SearchAnswer['hits'][number] {
    const advice = direct.advice(document)
    const preferred = new Set(advice.map(({ postId }) => postId))
    return { id: document.id, score, ...findPassage(unpackDocument(document), question, this.placed, preferred), ...(advice.length > 0 ? { advice } : {}) }
  }
}

const byScore = (a: Scored, b: Scored): number =>
  b.score - a.score || b.kept.document.createdAt - a.kept.document.createdAt || a.kept.document.id - b.kept.document.id

const nthLargest = (values: readonly number[], n: number): number => Float64Array.from(values).sort()[Math.max(0, values.length - n)] ?? 0

function passes(document: Omit<PackedDocument, 'texts'>, filters: SearchFilters): boolean {
  return (filters.kit === undefined || document.kit === filters.kit)
    && (filters.section === undefined || document.sections.includes(filters.section))
    && (filters.operation === undefined || document.operations.includes(filters.operation))
    && (filters.kind === undefined || document.kind === filters.kind)
    && (filters.stamped === undefined || document.stamped === filters.stamped)
}
