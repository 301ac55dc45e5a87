// npm run eval:search -- FOLDER: how well search finds what people judged to be the answer. The measuring stands in tests/measure/search.
import { parseArgs } from 'node:util'
import { reportEvaluation } from '../tests/measure/search/report-evaluation'

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: {
    /** Other files of the folder, such as qrels-graded.tsv and queries-typo.jsonl. */
    qrels: { type: 'string' }, queries: { type: 'string' },
    /** Also each question with weights chosen on the questions of the other folds. */
    folds: { type: 'string' },
    /** Print each question that is not answered first. */
    missed: { type: 'boolean', default: false },
  },
})
if (positionals.length !== 1 || !positionals[0]) {
  console.error('Usage: npm run eval:search -- FOLDER [--qrels FILE] [--queries FILE] [--folds 5] [--missed]')
  process.exit(2)
}
reportEvaluation(positionals[0], { ...values, folds: values.folds === undefined ? undefined : Number(values.folds) })
