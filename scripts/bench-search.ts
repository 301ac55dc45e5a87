// npm run bench:search: search at growing sizes beside its peers. Measures and reports; the measuring stands in tests/measure/search.
import { parseArgs } from 'node:util'
import { machine } from '../tests/measure/result'
import { allEngines, benchSearch } from '../tests/measure/search/bench-search'
import { reportBench } from '../tests/measure/search/report-bench'

const { values } = parseArgs({
  options: {
    sizes: { type: 'string', default: '1000,10000,100000' },
    /** How long is written while questions are asked. */
    seconds: { type: 'string', default: '20' },
    /** Questions of each kind. */
    each: { type: 'string', default: '200' }, seed: { type: 'string', default: '20' },
    /** Some of the engines only; product first, or nothing is written. */
    engines: { type: 'string', default: allEngines.join(',') },
  },
})
const whole = (text: string) => {
  const value = Number(text)
  if (!Number.isSafeInteger(value) || value < 1) throw new Error(`${text} is not a whole number from 1`)
  return value
}
const wanted = values.engines.split(',')
const before = machine()
reportBench(await benchSearch({
  sizes: values.sizes.split(',').map(whole), seconds: whole(values.seconds), each: whole(values.each), seed: whole(values.seed), engines: allEngines.filter((engine) => wanted.includes(engine)),
}), before)
