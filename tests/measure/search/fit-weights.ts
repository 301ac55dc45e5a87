// Chooses the numbers that rank (lib/domain/search/weights.ts) on judged questions: one number after the other over a grid,
// as long as that helps. No chance in it: the same questions choose the same weights.
import { searchWeights, type SearchWeights } from '@/lib/domain/search/weights'
import type { Collection, JudgedQuestion } from './collection'
import { evaluate, summarise, type Answered, type Evaluation } from './evaluate'

/** One number and the values it may have. */
interface Coordinate { name: string; values: readonly number[]; read(weights: SearchWeights): number; with(weights: SearchWeights, value: number): SearchWeights }

type Factor = Exclude<keyof SearchWeights['factor'], 'corrected'>
const factor = (name: Factor, values: readonly number[]): Coordinate => ({
  name, values, read: (w) => w.factor[name], with: (w, value) => ({ ...w, factor: { ...w.factor, [name]: value } }),
})
const bm25 = (name: keyof SearchWeights['bm25'], values: readonly number[]): Coordinate => ({
  name: `bm25 ${name}`, values, read: (w) => w.bm25[name], with: (w, value) => ({ ...w, bm25: { ...w.bm25, [name]: value } }),
})
const coverage = (name: keyof SearchWeights['coverage'], values: readonly number[]): Coordinate => ({
  name: `coverage ${name}`, values, read: (w) => w.coverage[name], with: (w, value) => ({ ...w, coverage: { ...w.coverage, [name]: value } }),
})

const feedback = (name: keyof SearchWeights['feedback'], values: readonly number[]): Coordinate => ({
  name: `feedback ${name}`, values, read: (w) => w.feedback[name], with: (w, value) => ({ ...w, feedback: { ...w.feedback, [name]: value } }),
})

const coordinates: readonly Coordinate[] = [
  { name: 'title repeats', values: [1, 2, 3, 4, 5], read: (w) => w.titleRepeats, with: (w, titleRepeats) => ({ ...w, titleRepeats }) },
  bm25('k', [0.9, 1.2, 1.5, 1.8, 2.2]), bm25('b', [0.4, 0.55, 0.7, 0.85]),
  factor('synonym', [0.3, 0.4, 0.5, 0.65, 0.8]), factor('also', [0.1, 0.25, 0.4, 0.6]), factor('joined', [0.2, 0.5, 0.8]),
  factor('splitKnown', [0, 0.2, 0.4]), factor('splitUnknown', [0.7, 0.9]), factor('completed', [0.6, 0.8, 1]),
  factor('unit', [0.1, 0.3, 0.5]), factor('unknownNumber', [0.2, 0.4, 0.6]),
  coverage('short', [0.4, 0.45, 0.5, 0.55]), coverage('perConcept', [0.02, 0.04, 0.06]), coverage('least', [0.25, 0.29, 0.33, 0.37]),
  feedback('concepts', [3, 4, 5]), feedback('entries', [4, 6, 8]), feedback('terms', [15, 25, 40]), feedback('weight', [0.1, 0.2, 0.3, 0.4]),
]
const mostRounds = 3
/** Less is chance: with forty questions one more answered is worth 0.05. */
const leastGain = 0.002

/** What is made large: half for the answer first, a quarter each for it among three and for the whole order; a share for plainly nothing. */
export function worthOf({ mean, absent }: Evaluation): number {
  const found = 0.5 * mean.success1 + 0.25 * mean.success3 + 0.25 * mean.ndcg10
  return absent.questions === 0 ? found : 0.9 * found + 0.1 * (absent.nothing / absent.questions)
}

/** Weights for the questions given, from those in use onwards. Several collections count alike, however many questions they have. */
export function fitWeights(collections: readonly Collection[], tell: (line: string) => void = () => undefined): SearchWeights {
  const worth = (weights: SearchWeights) => collections.reduce((sum, one) => sum + worthOf(evaluate(one, weights)), 0) / collections.length
  let best = { weights: searchWeights, worth: worth(searchWeights) }
  tell(`in use: ${best.worth.toFixed(4)}`)
  for (let round = 0; round < mostRounds; round++) {
    const before = best.worth
    for (const { name, values, read, with: change } of coordinates) {
      for (const value of values) {
        if (value === read(best.weights)) continue
        const weights = change(best.weights, value)
        const reached = worth(weights)
        if (reached < best.worth + leastGain) continue
        best = { weights, worth: reached }
        tell(`${name} ${value}: ${reached.toFixed(4)}`)
      }
    }
    if (best.worth === before) break
  }
  return best.weights
}

/** Every question answered with weights that were chosen without it: question i belongs to fold i mod `folds`. */
export function evaluateFolds(collection: Collection, folds: number): Evaluation {
  if (!Number.isSafeInteger(folds) || folds < 2) throw new Error(`${folds} is no number of folds`)
  const isIn = (fold: number) => (_: JudgedQuestion, i: number) => i % folds === fold
  const answered = Array.from({ length: folds }, (_, fold): Answered[] => {
    const others = collection.questions.filter((question, i) => !isIn(fold)(question, i))
    return evaluate(collection, fitWeights([{ ...collection, questions: others }]), collection.questions.filter(isIn(fold))).answered
  })
  return summarise(answered.flat())
}
