// Runs Vitest projects and counts what passed and failed from its JSON report.
import { existsSync, readFileSync, rmSync } from 'node:fs'
import path from 'node:path'
import { bin, root, runNode } from './run-command.mjs'

/**
 * Returns how many tests of `projects` passed and failed. A run that broke without a failed test (a file that
 * can't be loaded, no report at all) counts as one failure.
 */
export async function runVitest(projects) {
  const report = path.join('dist', `vitest-${projects.join('-')}.json`)
  rmSync(path.join(root, report), { force: true })
  const code = await runNode([
    bin('vitest', 'vitest.mjs'), 'run', ...projects.flatMap((project) => ['--project', project]),
    '--reporter=default', '--reporter=json', `--outputFile.json=${report}`,
  ])
  if (!existsSync(path.join(root, report))) return { passed: 0, failed: 1 }
  const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(path.join(root, report), 'utf8'))
  return { passed: numPassedTests, failed: code === 0 ? numFailedTests : Math.max(1, numFailedTests) }
}
