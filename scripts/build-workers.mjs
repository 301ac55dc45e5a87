// Bundles each worker thread into one file under dist/workers/, the same for server, tests and scripts.
// The framework's own bundler does it only inside a build, and Node 20 loads no TypeScript.
import { existsSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { build } from 'esbuild'

const root = fileURLToPath(new URL('..', import.meta.url))
const workers = { render: 'lib/render/worker.ts', search: 'lib/search/worker.ts' }

/**
 * Writes dist/workers/<name>.mjs for every worker of the tree into `outDirectory`; returns the files.
 * @param {string} [outDirectory]
 * @returns {Promise<string[]>}
 */
export async function buildWorkers(outDirectory = path.join(root, 'dist', 'workers')) {
  const present = Object.entries(workers).filter(([, entry]) => existsSync(path.join(root, entry)))
  await build({
    absWorkingDir: root,
    entryPoints: Object.fromEntries(present.map(([name, entry]) => [name, path.join(root, entry)])),
    outdir: outDirectory,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    format: 'esm',
    target: 'node20',
    // server-only throws unless this condition is named; in a thread it only marks a room.
    conditions: ['react-server'],
    alias: { '@': root.replace(/\/$/, '') },
    loader: { '.json': 'json' },
    logLevel: 'warning',
  })
  return present.map(([name]) => path.join(outDirectory, `${name}.mjs`))
}

if (process.argv[1] && path.resolve(process.argv[1]) === fileURLToPath(import.meta.url)) {
  for (const file of await buildWorkers()) console.log(path.relative(root, file))
}
