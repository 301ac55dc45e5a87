// Which words of the corpus a word means that no entry holds: a slip of the finger, or two words written as one.
import type { Candidate, Vocabulary } from './vocabulary'

/** Candidates for a mistyped `word`: one slip first; two only in longer words when one finds nothing. Best first, at most three. */
export function findMeantWords(word: string, vocabulary: Vocabulary): Candidate[] {
  if (word.length < 3) return []
  const one = sameFirstWhenShort(word, vocabulary.near(word, 1, 12))
  const found = one.length > 0 || word.length < 5 ? one : farther(word, vocabulary)
  const best = found[0]?.cost ?? 0
  return found.filter((candidate) => candidate.cost <= best + 0.25).slice(0, 3)
}

/** Two slips: the first letter has to be right unless the word is long, or everything would mean everything. */
function farther(word: string, vocabulary: Vocabulary): Candidate[] {
  return vocabulary.near(word, 2, 12).filter((c) => c.word.length >= 5 && (word.length >= 8 || c.word[0] === word[0]))
}

function sameFirstWhenShort(word: string, candidates: Candidate[]): Candidate[] {
  return word.length >= 5 ? candidates : candidates.filter((c) => c.word[0] === word[0] && c.word.length >= 3)
}

/** `sparkplug` as [spark, plug] when entries hold both; the split whose rarer half is commonest. Null when there is none. */
export function splitCompound(word: string, vocabulary: Vocabulary): [string, string] | null {
  let best: { halves: [string, string]; documents: number } | null = null
  for (let cut = 3; cut <= word.length - 3; cut++) {
    const halves: [string, string] = [word.slice(0, cut), word.slice(cut)]
    const documents = Math.min(vocabulary.count(halves[0]), vocabulary.count(halves[1]))
    if (documents > (best?.documents ?? 0)) best = { halves, documents }
  }
  return best?.halves ?? null
}
