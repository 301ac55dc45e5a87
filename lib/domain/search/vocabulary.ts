// The words a corpus holds, with how many entries hold each: for finding what a slip of the finger or a half-typed word meant.
import { editDistance } from './edit-distance'

export interface Candidate {
  word: string
  /** Entries that hold it. */
  documents: number
  /** 0 = as written; a slip costs about 1, less where fingers often slip, more in the first letter. */
  cost: number
}

export class Vocabulary {
  private readonly places = new Map<string, number>()
  private readonly words: string[] = []
  private readonly documents: number[] = []
  /** Which letters a word holds, one bit each: a distance is at least half the differing bits, so most words are passed over by one AND. */
  private letters = new Int32Array(1024)

  add(word: string, documents = 1): void {
    const place = this.places.get(word) ?? this.append(word)
    this.documents[place] = (this.documents[place] ?? 0) + documents
  }

  remove(word: string): void {
    const place = this.places.get(word)
    if (place !== undefined) this.documents[place] = Math.max(0, (this.documents[place] ?? 0) - 1)
  }

  /** Entries that hold `word`. */
  count(word: string): number {
    const place = this.places.get(word)
    return place === undefined ? 0 : (this.documents[place] ?? 0)
  }

  /** Words at most `limit` slips from `word`, cheapest first, then commonest; at most `most`. */
  near(word: string, limit: number, most: number): Candidate[] {
    const found: Candidate[] = []
    const mask = lettersOf(word)
    for (let place = 0; place < this.words.length; place++) {
      if (bitCount(mask ^ (this.letters[place] ?? 0)) > 2 * limit || (this.documents[place] ?? 0) === 0) continue
      const other = this.words[place] ?? ''
      const distance = editDistance(word, other, limit)
      if (distance <= limit) found.push({ word: other, documents: this.documents[place] ?? 0, cost: costOf(word, other, distance) })
    }
    return found.sort(byCost).slice(0, most)
  }

  /** Words that begin with `prefix`, commonest first; at most `most`. */
  startingWith(prefix: string, most: number): Candidate[] {
    const found: Candidate[] = []
    const mask = lettersOf(prefix)
    for (let place = 0; place < this.words.length; place++) {
      if ((mask & ~(this.letters[place] ?? 0)) !== 0 || (this.documents[place] ?? 0) === 0) continue
      const word = this.words[place] ?? ''
      if (!word.startsWith(prefix)) continue
      found.push({ word, documents: this.documents[place] ?? 0, cost: 0 })
    }
    return found.sort(byCost).slice(0, most)
  }

  private append(word: string): number {
    const place = this.words.length
    if (place >= this.letters.length) {
      const larger = new Int32Array(this.letters.length * 2)
      larger.set(this.letters)
      this.letters = larger
    }
    this.places.set(word, place)
    this.words.push(word)
    this.documents.push(0)
    this.letters[place] = lettersOf(word)
    return place
  }
}

const byCost = (a: Candidate, b: Candidate): number => a.cost - b.cost || b.documents - a.documents || (a.word < b.word ? -1 : 1)

/** A letter left out or doubled, and two changed round, are the commonest slips; the first letter is seldom wrong. */
function costOf(typed: string, meant: string, distance: number): number {
  const sameLetters = typed.length === meant.length && [...typed].sort().join('') === [...meant].sort().join('')
  const easy = sameLetters || meant.length > typed.length ? 0.2 : 0
  return distance - easy + (typed[0] === meant[0] ? 0 : 0.5)
}

function lettersOf(word: string): number {
  let mask = 0
  for (let i = 0; i < word.length; i++) {
    const code = word.charCodeAt(i) - 97
    mask |= code >= 0 && code < 26 ? 1 << code : 1 << (26 + (word.charCodeAt(i) % 6))
  }
  return mask
}

function bitCount(value: number): number {
  let v = value - ((value >>> 1) & 0x55555555)
  v = (v & 0x33333333) + ((v >>> 2) & 0x33333333)
  return (((v + (v >>> 4)) & 0x0f0f0f0f) * 0x01010101) >>> 24
}
