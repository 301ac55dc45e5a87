// npm run fit:search -- FOLDER...: chooses the weights of search on judged questions and prints them; lib/domain/search/weights.ts is
// changed by hand, because a number that helps forty questions is not yet right. The fitting stands in tests/measure/search.
import { parseArgs } from 'node:util'
import { readCollection } from '../tests/measure/search/collection'
import { fitWeights } from '../tests/measure/search/fit-weights'

const { positionals } = parseArgs({ allowPositionals: true })
if (positionals.length === 0) {
  console.error('Usage: npm run fit:search -- FOLDER...')
  process.exit(2)
}
console.log(JSON.stringify(fitWeights(positionals.map((folder) => readCollection(folder)), console.log), null, 2))
