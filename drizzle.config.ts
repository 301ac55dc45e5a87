// drizzle-kit only generates SQL here (npm run db:generate); db/migrate.ts applies it.
import { defineConfig } from 'drizzle-kit'

export default defineConfig({ dialect: 'sqlite', schema: './db/schema/index.ts', out: './drizzle', casing: 'snake_case' })
