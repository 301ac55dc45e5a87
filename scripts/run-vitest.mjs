// Runs Vitest projects and counts what passed and failed from its JSON report.
import { existsSync, readFileSync, rmSync } from 'node:fs'
import path from 'node:path'
import { bin, root, runNode } from './run-command.mjs'

/**
 * Returns how many tests of `projects` passed and failed, and the names of those that failed: they stand thousands of lines above the end. A run that broke without a failed test (a file that
 * can't be loaded, no report at all) counts as one failure.
 */
export async function runVitest(projects) {
  const report = path.join('dist', `vitest-${projects.join('-')}.json`)
  rmSync(path.join(root, report), { force: true })
  const code = await runNode([
    bin('vitest', 'vitest.mjs'), 'run', ...projects.flatMap((project) => ['--project', project]),
    '--reporter=default', '--reporter=json', `--outputFile.json=${report}`,
  ])
  if (!existsSync(path.join(root, report))) return { passed: 0, failed: 1, names: [`no report of ${projects.join(' and ')}`] }
  const { numPassedTests, numFailedTests, testResults } = JSON.parse(readFileSync(path.join(root, report), 'utf8'))
  return { passed: numPassedTests, failed: code === 0 ? numFailedTests : Math.max(1, numFailedTests), names: testResults.flatMap(failuresOf) }
}

function failuresOf({ name, status, message, assertionResults }) {
  const file = path.relative(root, name)
  const failed = assertionResults.filter((test) => test.status === 'failed')
  if (failed.length === 0) return status === 'failed' ? [`${file}: ${message.split('\n')[0]}`] : []
  return failed.map(({ fullName, failureMessages }) => `${file}: ${fullName}\n    ${failureMessages.join('\n').split('\n').slice(0, 3).join('\n    ')}`)
}
