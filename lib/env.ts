// The only reader of process.env. Parsed once at start; a bad or missing setting stops the start and is named.
import { readFileSync } from 'node:fs'
import path from 'node:path'
import nextEnv from '@next/env'
import { z } from 'zod'

const { loadEnvConfig } = nextEnv

const flag = (fallback: boolean) => z.enum(['on', 'off'], 'must be on or off').default(fallback ? 'on' : 'off').transform((v) => v === 'on')
const whole = (fallback: number, min: number, max: number) => z.string().regex(/^[0-9]+$/, 'must be a whole number').default(String(fallback))
  .transform(Number).pipe(z.number().min(min, `must be at least ${min}`).max(max, `must be at most ${max}`))

const settings = z.object({
  NODE_ENV: z.enum(['development', 'production', 'test']).default('development'),
  /** Folder of all state: database, secret. */
  DATA_DIR: z.string().min(1).default('data'),
  PORT: whole(3000, 1, 65_535),
  /** Signs sessions. At least 32 characters and not guessable; else read from DATA_DIR/secret, which the demo makes. */
  AUTH_SECRET: z.string().optional(),
  /** Where people reach it, such as https://pilothole.example.org. Decides cookie security and feed addresses. */
  PUBLIC_URL: z.url({ protocol: /^https?$/, error: 'must be an http or https address' }).optional(),
  /** Visitors may read. */
  PUBLIC_READING: flag(true),
  /** Anybody may sign up. */
  SIGN_UP: flag(true),
  /** The proxy in front sets X-Forwarded-For. */
  TRUST_PROXY: flag(false),
  READS_PER_MINUTE: whole(600, 1, 1_000_000),
  WRITES_PER_MINUTE: whole(120, 1, 1_000_000),
  SIGN_INS_PER_QUARTER_HOUR: whole(10, 1, 1_000_000),
})

export interface Env extends Omit<z.infer<typeof settings>, 'AUTH_SECRET' | 'DATA_DIR'> {
  secret: string
  dataDirectory: string
  databaseFile: string
  publicUrl: string
}

/** Thrown at start with one line a bad setting. Values are never printed. */
export class SettingsError extends Error {}

let parsed: Env | undefined

/** The settings, parsed at first use. Throws SettingsError. */
export function env(): Env {
  if (!parsed) {
    // The framework reads .env for the server; scripts read the same file here.
    loadEnvConfig(process.cwd(), false, { info: () => undefined, error: console.error })
    parsed = readEnv(process.env)
    // next-auth reads its own address from here and warns without it.
    process.env['NEXTAUTH_URL'] ??= parsed.publicUrl
  }
  return parsed
}

/** Pure but for the secret file: parses a set of variables. */
export function readEnv(variables: Record<string, string | undefined>): Env {
  const given = Object.fromEntries(Object.entries(variables).filter(([, v]) => v !== undefined && v !== ''))
  const result = settings.safeParse(given)
  if (!result.success) throw new SettingsError(result.error.issues.map((i) => `${i.path.join('.')} ${i.message}`).join('\n'))
  const dataDirectory = path.resolve(result.data.DATA_DIR)
  const secret = result.data.AUTH_SECRET ?? readSecretFile(dataDirectory)
  if (secret === null) throw new SettingsError('AUTH_SECRET is missing: set it to at least 32 random characters (openssl rand -base64 48)')
  const weakness = secretWeakness(secret)
  if (weakness) throw new SettingsError(`AUTH_SECRET is weak: ${weakness}`)
  return {
    ...result.data, secret, dataDirectory, databaseFile: path.join(dataDirectory, 'pilothole.db'),
    publicUrl: (result.data.PUBLIC_URL ?? `http://localhost:${result.data.PORT}`).replace(/\/$/, ''),
  }
}

function readSecretFile(dataDirectory: string): string | null {
  try {
    return readFileSync(path.join(dataDirectory, 'secret'), 'utf8').trim()
  } catch {
    return null
  }
}

/** Why a secret will not do, or null. */
export function secretWeakness(secret: string): string | null {
  if (secret.length < 32) return 'it has fewer than 32 characters'
  if (new Set(secret).size < 12) return 'it repeats itself'
  if (/change.?me|secret|password|example/i.test(secret)) return 'it reads like a placeholder'
  return null
}
