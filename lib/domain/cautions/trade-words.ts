// Trade text as a row of words: lower case, stemmed, with the place of each in the text. Knows nothing of cautions.
import { stemmer } from 'stemmer'

/** One word. `position` counts words, with extra steps at the end of a sentence or paragraph. */
export interface TradeWord {
  form: string
  stem: string
  start: number
  end: number
  position: number
  sentence: number
}

/** A text's words, and where each stem and form stands (indices in order): a matcher looks up its own few instead of reading all. */
export interface TradeText {
  words: readonly TradeWord[]
  byStem: ReadonlyMap<string, readonly number[]>
  byForm: ReadonlyMap<string, readonly number[]>
}

const SENTENCE_STEPS = 3
const PARAGRAPH_STEPS = 30
// Longer runs are part numbers or noise; Porter's rules are for words.
const LONGEST_STEMMED = 24

/** The stem of a lower-case word. The word "ribs" and "rib", "drilled" and "drilling" meet here. */
export function stemOf(form: string): string {
  return form.length > LONGEST_STEMMED ? form : stemmer(form)
}

/** The form a word is compared in: lower case, straight apostrophe, no possessive. */
export function formOf(word: string): string {
  const lower = word.toLowerCase()
  // Most words have no apostrophe, and this runs for every word of a text.
  return lower.includes("'") || lower.includes('\u2019') ? lower.replace('\u2019', "'").replace(/'s?$/, '') : lower
}

/** Words of a text in order. Linear in its length; offsets are UTF-16 code units of the text as given. */
export function tradeWords(text: string): TradeWord[] {
  const words: TradeWord[] = []
  const stems = new Map<string, string>()
  let position = 0
  let sentence = 0
  let end = 0
  for (const match of text.matchAll(/\p{N}+(?:\.\p{N}+)?(?=[^\p{L}\p{N}]|$)|[\p{L}\p{N}]+(?:['\u2019]\p{L}+)?/gu)) {
    const between = text.slice(end, match.index)
    if (/\n\s*\n/.test(between)) [position, sentence] = [position + PARAGRAPH_STEPS, sentence + 1]
    else if (/[.!?;:]\s|\n/.test(between)) [position, sentence] = [position + SENTENCE_STEPS, sentence + 1]
    const form = formOf(match[0])
    const stem = stems.get(form) ?? stemOf(form)
    stems.set(form, stem)
    end = match.index + match[0].length
    words.push({ form, stem, start: match.index, end, position, sentence })
    position += 1
  }
  return words
}

/** A text read once for many matchers. */
export function readTrade(text: string): TradeText {
  const words = tradeWords(text)
  const byStem = new Map<string, number[]>()
  const byForm = new Map<string, number[]>()
  words.forEach(({ stem, form }, index) => {
    add(byStem, stem, index)
    add(byForm, form, index)
  })
  return { words, byStem, byForm }
}

function add(map: Map<string, number[]>, key: string, index: number): void {
  const list = map.get(key)
  if (list) list.push(index)
  else map.set(key, [index])
}
