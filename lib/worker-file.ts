// Where npm run build:workers puts the bundled workers.
import 'server-only'
import path from 'node:path'

/** Path of a bundled worker. */
export const workerFile = (name: 'render' | 'search') => path.join(/* turbopackIgnore: true */ process.cwd(), 'dist', 'workers', `${name}.mjs`)
