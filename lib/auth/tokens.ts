// Personal tokens (pht_…): printed once, stored hashed.
import 'server-only'
import { createHash, randomBytes } from 'node:crypto'

/** A new token, 256 bits, base64url. */
export const newToken = (): string => `pht_${randomBytes(32).toString('base64url')}`

/** SHA-256 is enough for a secret of 256 random bits. */
export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex')
