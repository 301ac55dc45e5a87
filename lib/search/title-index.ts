// Titles by how they begin to be typed: whole words, the last one unfinished. No stems and no stop words, because titles are completed as written.
import 'server-only'
import MiniSearch from 'minisearch'
import { normaliseWord } from '@/lib/domain/search/analyse-text'

/** One letter begins too many titles to be worth a look. */
const shortestText = 2
const mostWords = 12

export class TitleIndex {
  private readonly mini = new MiniSearch<{ id: number; title: string }>({
    fields: ['title'],
    tokenize: wordsOf,
    processTerm: (term) => term,
    searchOptions: { combineWith: 'AND', prefix: (_, index, terms) => index === terms.length - 1 },
    autoVacuum: { minDirtCount: 50, minDirtFactor: 0.05, batchSize: 100, batchWait: 5 },
  })

  put(id: number, title: string): void {
    if (this.mini.has(id)) this.mini.replace({ id, title })
    else this.mini.add({ id, title })
  }

  remove(id: number): void {
    if (this.mini.has(id)) this.mini.discard(id)
  }

  /** Ids of titles that hold all words of `text`, the last one as a beginning; best first. */
  complete(text: string, limit: number): number[] {
    const words = wordsOf(text.slice(0, 500))
    if (words.length === 0 || words.length > mostWords || words.join('').length < shortestText) return []
    return this.mini.search(words.join(' ')).slice(0, limit).map((result) => Number(result.id))
  }
}

function wordsOf(text: string): string[] {
  return (normaliseWord(text).match(/#?[\p{L}\p{N}](?:[\p{L}\p{N}'./·-]*[\p{L}\p{N}])?/gu) ?? []).map((word) => word.slice(0, 40))
}
