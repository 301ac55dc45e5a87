// Says whether the committed SQL in drizzle/ is what the schema in db/schema gives. Leaves no file.
import { cpSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { bin, root, runNode } from './run-command.mjs'

const copy = path.join('dist', 'drizzle-check')
const config = path.join('dist', 'drizzle-check.config.ts')
const listing = () => readdirSync(path.join(root, copy), { recursive: true }).sort().join('\n')

/** True when `drizzle-kit check` is content and `drizzle-kit generate` on a copy would write nothing. */
export async function generatedSqlIsCurrent() {
  const kit = bin('drizzle-kit', 'bin.cjs')
  try {
    rmSync(path.join(root, copy), { recursive: true, force: true })
    cpSync(path.join(root, 'drizzle'), path.join(root, copy), { recursive: true })
    writeFileSync(path.join(root, config), `import config from '../drizzle.config'\nexport default { ...config, out: './${copy}' }\n`)
    const before = listing()
    if (await runNode([kit, 'check', `--config=${config}`]) !== 0) return false
    if (await runNode([kit, 'generate', `--config=${config}`]) !== 0) return false
    if (listing() === before) return true
    console.error('The schema has changes without SQL: run `npm run db:generate`, read the SQL, commit it.')
    return false
  } finally {
    rmSync(path.join(root, copy), { recursive: true, force: true })
    rmSync(path.join(root, config), { force: true })
  }
}
