// What people send about themselves: sign-up, sign-in, profile, password, tokens, closing the account.
// What stewards do to members stands in acts.ts.
import type { Route } from 'next'
import { z } from 'zod'
import { unitsChoices } from '@/lib/format/units-choice'
import { idText, limits, line, optionalParagraph } from './text'

/** Lower-cased, since the same address in another case is the same person. 254 is the most RFC 5321 lets through. */
const email = z.string().transform((v) => v.trim().toLowerCase()).pipe(z.email('Write an e-mail address, such as you@example.org.').max(254, 'At most 254 characters.'))
const newPassword = z.string().min(10, 'At least 10 characters. A few words in a row do well.').max(200, 'At most 200 characters.')
const presentPassword = z.string().min(1, 'Write your password.').max(1000, 'This is not your password.')

/**
 * Where to go after signing in: a path of this site, or null. Other sites, `//host`, `/\host` and control characters
 * would send somebody away under our name; the sign-in pages themselves would go in circles.
 */
export function sitePath(value: string): Route | null {
  if (!/^\/(?![/\\])[^\u0000-\u001f\u007f\\]{0,2000}$/.test(value)) return null
  const address = new URL(value, 'http://this.site')
  // Resolving dots can bring a second slash to the front: '/..//host' is somebody else's host.
  if (address.origin !== 'http://this.site' || address.pathname.startsWith('//') || /^\/(sign-in|sign-up|api)(\/|$)/.test(address.pathname)) return null
  return `${address.pathname}${address.search}${address.hash}` as Route
}
const returnPath = z.string().default('').transform(sitePath)

export const signUpSchema = z.strictObject({ name: line(limits.name, 'your name'), email, password: newPassword, from: returnPath })
/** Nothing but presence is checked: whether the two fit is said in one sentence, whatever was wrong. */
export const signInSchema = z.strictObject({
  email: z.string().trim().min(1, 'Write your e-mail address.').max(1000, 'At most 1,000 characters.'), password: presentPassword, from: returnPath,
})
export const profileSchema = z.strictObject({ name: line(limits.name, 'your name'), bio: optionalParagraph(limits.note) })
export const unitsSchema = z.strictObject({ units: z.enum(unitsChoices.map((choice) => choice.value), 'Choose one of the three.') })
export const changePasswordSchema = z.strictObject({ currentPassword: presentPassword, newPassword })
export const newTokenSchema = z.strictObject({ name: line(limits.name, 'a name, such as the program that will use it') })
export const revokeTokenSchema = z.strictObject({ tokenId: idText })
export const closeAccountSchema = z.strictObject({ currentPassword: presentPassword })

export type SignUp = z.infer<typeof signUpSchema>
export type Profile = z.infer<typeof profileSchema>
export type Units = z.infer<typeof unitsSchema>
export type ChangePassword = z.infer<typeof changePasswordSchema>
