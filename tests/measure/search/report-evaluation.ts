// Prints an evaluation as one table and keeps it as JSON, so that two can be compared.
import { mkdirSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { searchWeights } from '@/lib/domain/search/weights'
import { readCollection, type CollectionFiles } from './collection'
import { evaluate, type Evaluation } from './evaluate'
import { evaluateFolds } from './fit-weights'
import type { Scores } from './metrics'

export interface EvaluationOptions extends CollectionFiles { folds?: number | undefined; missed?: boolean | undefined }

/** Evaluates `folder` with the weights that are in use; with `folds` also with weights that never saw the question. */
export function reportEvaluation(folder: string, { folds, missed, ...files }: EvaluationOptions): void {
  const collection = readCollection(folder, files)
  const evaluation = evaluate(collection)
  const folded = folds === undefined ? null : evaluateFolds(collection, folds)
  console.log(`${collection.name}: ${collection.documents.length} documents`)
  const styles = evaluation.byStyle.length > 1 ? evaluation.byStyle.map(({ style, questions, mean }) => row(style, questions, mean)) : []
  console.table([...styles, summaryRow('all', evaluation), ...(folded ? [summaryRow(`all, ${folds} folds`, folded)] : [])])
  if (missed) printMissed(evaluation)
  const file = path.join('dist', `eval-${collection.name.replaceAll(/[^a-z0-9]+/gi, '-')}.json`)
  mkdirSync('dist', { recursive: true })
  writeFileSync(file, `${JSON.stringify({ collection: collection.name, at: new Date().toISOString(), weights: searchWeights, evaluation: shortened(evaluation), folded: folded && shortened(folded) }, null, 2)}\n`)
  console.log(`Kept in ${file}`)
}

const summaryRow = (what: string, { answered, absent, mean }: Evaluation) => ({
  ...row(what, answered.length - absent.questions, mean), ...(absent.questions > 0 ? { 'nothing said of absent': `${absent.nothing} of ${absent.questions}` } : {}),
})

function row(what: string, questions: number, mean: Scores) {
  const shown = (value: number) => Math.round(value * 1_000) / 1_000
  return {
    what, questions, MAP: shown(mean.averagePrecision), 'nDCG@10': shown(mean.ndcg10), 'P@5': shown(mean.precision5), 'recall@100': shown(mean.recall100),
    MRR: shown(mean.reciprocalRank), 'success@1': shown(mean.success1), 'success@3': shown(mean.success3),
  }
}

/** What a person would look at: questions not answered first, and absent ones that were given something. */
function printMissed({ answered }: Evaluation): void {
  for (const { question, found, scores, didYouMean } of answered) {
    if (question.absent ? found.length === 0 : scores.success1 === 1) continue
    const first = found.slice(0, 4).map((id) => `${id}:${question.gains.get(id) ?? 0}`).join(' ')
    console.log(`${question.id} [${question.style}] ${question.text} -> ${first || 'nothing'}${didYouMean === null ? '' : ` (${didYouMean}?)`}; best ${[...question.gains].filter(([, gain]) => gain >= 2).map(([id]) => id).join(' ')}`)
  }
}

const shortened = ({ answered, ...rest }: Evaluation) => ({ ...rest, questions: answered.map(({ question, found, scores }) => ({ id: question.id, found: found.slice(0, 10), scores })) })
