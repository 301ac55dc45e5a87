// npm run bench -- writers|load|start|kill: measures what is promised (DEVELOPERS.md, Numbers) and ends with 1 when a promise is broken.
// The measuring itself stands in tests/measure. `load` and `kill` need a production build.
import { parseArgs } from 'node:util'
import { measureKill } from '../tests/measure/kill-nine'
import { measureLoad } from '../tests/measure/load'
import { machine, report, type Result } from '../tests/measure/result'
import { measureStart } from '../tests/measure/second-start'
import { measureWriters } from '../tests/measure/writers'

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: {
    /** load: a folder whose 10,000 entries are kept for the next run. */
    data: { type: 'string' },
    entries: { type: 'string', default: '10000' }, seconds: { type: 'string', default: '60' }, rate: { type: 'string', default: '20' },
    rounds: { type: 'string', default: '5' },
    /** load: an option of the server's Node, such as --cpu-prof. */
    node: { type: 'string', multiple: true, default: [] },
  },
})
const whole = (text: string) => {
  const value = Number(text)
  if (!Number.isSafeInteger(value) || value < 1) throw new Error(`${text} is not a whole number from 1`)
  return value
}
const measures: Record<string, () => Promise<Result>> = {
  writers: () => measureWriters({ rounds: whole(values.rounds) }),
  load: () => measureLoad({ entries: whole(values.entries), seconds: whole(values.seconds), rate: whole(values.rate), kept: values.data, nodeOptions: values.node }),
  kill: () => measureKill({ rounds: whole(values.rounds), writers: 20 }),
  start: () => measureStart(),
}
const measure = measures[positionals[0] ?? '']
if (!measure || positionals.length > 1) {
  console.error(`Usage: npm run bench -- ${Object.keys(measures).join('|')}`)
  process.exit(2)
}
const before = machine()
process.exitCode = report(await measure(), before) ? 0 : 1
