// Passwords: argon2id with OWASP's parameters, hashed off the main thread by the library.
import 'server-only'
import { hash, verify } from '@node-rs/argon2'

// OWASP Password Storage Cheat Sheet: argon2id, m = 19 MiB, t = 2, p = 1. Argon2id is the library's default algorithm.
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 }

export const hashPassword = (password: string): Promise<string> => hash(password, parameters)

// A stored hash nobody knows: an unknown e-mail takes as long as a wrong password.
let decoy: Promise<string> | undefined

/** Whether the password fits. A null hash costs the same time and never fits. */
export async function passwordFits(stored: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('nobody has this one')
  const fits = await verify(stored ?? (await decoy), password)
  return stored !== null && fits
}
