// The import directions of DEVELOPERS.md as lint zones: a rule that is not checked is a wish.
import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

const zone = (target, from, message, except) => ({ target, from, message, ...(except ? { except } : {}) })
const browserSafe = ['./schemas', './domain', './policy', './format', './paths.ts', './form-state.ts', './client', './fonts']

const config = [
  { ignores: ['.next/**', 'dist/**', 'data/**', 'node_modules/**', 'next-env.d.ts', 'drizzle/**'] },
  ...next,
  ...typescript,
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'import/no-restricted-paths': ['error', {
        zones: [
          zone('./db', './lib', 'db never imports lib: pass values in.'),
          zone('./db', './app', 'db never imports app.'),
          zone('./db', './components', 'db never imports components.'),
          zone('./lib', './app', 'lib never imports app.'),
          zone('./lib', './components', 'lib never imports components: the page passes them.'),
          zone('./components', './app', 'components never import app: pass actions as props.'),
          zone('./components', './db', 'components never import db.'),
          zone('./app', './db', 'pages and handlers go through lib/services.'),
          zone('./components', './lib', 'components import only the browser-safe part of lib.', browserSafe),
          zone('./lib/domain', './db', 'domain is pure.'),
          zone('./lib/domain', './lib', 'domain imports only domain.', ['./domain']),
          zone('./lib/policy', './db', 'policy is pure.'),
        ],
      }],
    },
  },
  {
    files: ['components/**', 'lib/client/**', 'app/**/*.tsx'],
    rules: {
      'no-restricted-imports': ['error', { paths: [
        { name: 'zod', message: 'zod weighs 92 kB in the browser: import type from lib/schemas and show the errors the server returns.' },
        { name: 'fs', message: 'server code' },
      ] }],
    },
  },
  { files: ['tests/**'], rules: { '@typescript-eslint/no-non-null-assertion': 'off' } },
]

export default config
