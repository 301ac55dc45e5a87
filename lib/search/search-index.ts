// The index itself: postings, titles and the words of the corpus side by side. The order of what they find is ranking.ts.
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
import type { SearchAnswer, SearchDocument, SearchFilters, SearchRequest, WhenOrdered } from './messages'
import { packDocument, unpackDocument, type PackedDocument } from './packed-document'
import type { PostingList } from './posting-list'
import { Postings } from './postings'
import { Question } from './question'
import { mostScored, Ranking, type Asked, type Kept, type Ranked, type Scored } from './ranking'
import { PlacedTermsOfTexts } from './placed-terms'
import { TitleIndex } from './title-index'

const mostConcepts = 24
const mostConceptsOfSimilar = 12
const leastCoverageOfSimilar = 0.25
/** A whole title holds so many terms that few entries share the same part of it: fewer are enough to find the nearest. */
const mostScoredOfSimilar = 300
/** Postings read for one question; the commonest words are left out beyond it, so that no text takes long. */
const mostPostings = 120_000

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
  private readonly ranking: Ranking

  constructor(synonyms: SynonymList, private readonly weights: SearchWeights = searchWeights) {
    this.postings = new Postings(weights.bm25)
    this.ranking = new Ranking(this.postings, this.slots)
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
    return this.ranking.rank(asked, { filters, least: leastCoverageOfSimilar, mostScored: mostScoredOfSimilar, wanted: limit }).found.slice(0, limit).map((scored) => this.hit(scored, asked))
  }

  suggest(text: string, limit: number): { id: number; title: string }[] {
    return this.titles.complete(text, limit).flatMap((id) => {
      const title = this.kept.get(id)?.document.title
      return title === undefined ? [] : [{ id, title }]
    })
  }

  /** Orders the best anew by what the first of them share, when they share anything. */
  private orderByFeedback(found: Scored[], question: Question): Scored[] {
    const { feedback } = this.weights
    const first = found.slice(0, feedback.entries).map(({ kept, score }) => ({ score, terms: termsOfDocument(unpackDocument(kept.document), this.synonyms, 1).all }))
    const further = feedbackQuestion(first, question, this.corpus(), feedback)
    return further ? this.ranking.orderByShared(found, further) : found
  }

  /** What both `search` and `explain` see. */
  private look({ text, filters, limit, offset }: SearchRequest): Looked {
    const understood = understandQuery(text, this.corpus(), { mostConcepts, completeLast: true, correct: true })
    const { affordable, tooCommon } = this.afford(understood.concepts)
    const question = new Question(affordable)
    const order = this.tasks.read(understood.didYouMean ?? text)
    const direct = new AskedDirectly(question, understood.places, order)
    const least = leastCoverage(affordable.length, this.weights.coverage)
    const ranked = this.ranking.rank({ question, direct }, { filters, least, mostScored, wanted: offset + limit })
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

  private hit({ kept: { document }, score }: Scored, { question, direct }: Asked): SearchAnswer['hits'][number] {
    const advice = direct.advice(document)
    const preferred = new Set(advice.map(({ postId }) => postId))
    return { id: document.id, score, ...findPassage(unpackDocument(document), question, this.placed, preferred), ...(advice.length > 0 ? { advice } : {}) }
  }
}
