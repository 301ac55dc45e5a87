// Builds for production unless the last build was of these same files. Imports only Node.
import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { bin, root, runNode } from './run-command.mjs'

// Whatever can change the build. Tests, scripts and data can't.
const sources = [
  'app', 'components', 'content', 'db', 'lib', 'public', 'scripts/build-workers.mjs', 'next.config.ts', 'postcss.config.mjs',
  'package-lock.json', 'proxy.ts', 'instrumentation.ts', 'tsconfig.json',
]
const hashFile = path.join(root, 'dist', 'build-hash')
const buildIdFile = path.join(root, '.next', 'BUILD_ID')

/**
 * Returns 'unchanged', 'built' or 'failed'. The hash is kept with the id of the build it belongs to, so that a
 * build made in another way in between is not taken for ours.
 */
export async function buildWhenChanged() {
  const hash = hashSources()
  if (existsSync(hashFile) && readFileSync(hashFile, 'utf8') === `${hash} ${buildId()}` && existsSync(path.join(root, 'dist', 'workers', 'render.mjs'))) return 'unchanged'
  rmSync(hashFile, { force: true })
  // NODE_ENV of the caller would end up in the build.
  const env = { NODE_ENV: 'production' }
  if (await runNode(['scripts/build-workers.mjs'], { env }) !== 0) return 'failed'
  if (await runNode([bin('next', 'dist/bin/next'), 'build'], { env }) !== 0) return 'failed'
  mkdirSync(path.dirname(hashFile), { recursive: true })
  writeFileSync(hashFile, `${hash} ${buildId()}`)
  return 'built'
}

/** The id of the present production build, or null. */
export function buildId() {
  return existsSync(buildIdFile) ? readFileSync(buildIdFile, 'utf8').trim() : null
}

function hashSources() {
  const hash = createHash('sha256')
  for (const file of sources.flatMap((source) => filesUnder(source))) {
    const bytes = readFileSync(path.join(root, file))
    hash.update(`${file}\0${bytes.length}\0`).update(bytes)
  }
  return hash.digest('hex')
}

function filesUnder(relative) {
  const full = path.join(root, relative)
  if (!existsSync(full)) return []
  if (!statSync(full).isDirectory()) return [relative]
  return readdirSync(full).sort().flatMap((name) => filesUnder(path.join(relative, name)))
}
