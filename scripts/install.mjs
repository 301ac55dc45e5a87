// Gets the machine ready: the right Node and the packages of the lock. Imports only Node: it runs before anything is installed.
import { createHash } from 'node:crypto'
import { existsSync, readFileSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { root, run } from './run-command.mjs'

const leastNode = [20, 20]
const lockFile = path.join(root, 'package-lock.json')
const installedFile = path.join(root, 'node_modules', '.pilothole-lock')

/** Ends the process with words when this Node is too old. */
export function requireNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number)
  if (major > leastNode[0] || (major === leastNode[0] && minor >= leastNode[1])) return
  console.error(`Node ${leastNode.join('.')} or newer is needed; this is ${process.versions.node}.`)
  process.exit(1)
}

/** Installs what the lock names when it is not what is installed. Ends the process when that fails. */
export async function ensureInstalled() {
  const wanted = createHash('sha256').update(readFileSync(lockFile)).digest('hex')
  if (existsSync(installedFile) && readFileSync(installedFile, 'utf8').trim() === wanted) return
  console.log('Installing packages (npm ci) …')
  // The build checks types, so it needs the development packages whatever NODE_ENV says.
  const code = await run('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'])
  if (code !== 0) {
    console.error('npm ci failed; what is installed is incomplete.')
    process.exit(code)
  }
  writeFileSync(installedFile, `${wanted}\n`)
}
