// Sets and clears the session cookie in next-auth's own format, so that the sign-in form works without JavaScript.
import 'server-only'
import { cookies } from 'next/headers'
import { encode } from 'next-auth/jwt'
import { env } from '@/lib/env'
import { sessionMaxAgeSeconds } from './options'

const isSecure = () => env().publicUrl.startsWith('https:')
export const sessionCookieName = () => (isSecure() ? '__Secure-next-auth.session-token' : 'next-auth.session-token')

/** The signed value of a session cookie. */
export const sessionToken = (member: { id: number; sessionEpoch: number }, secret: string): Promise<string> =>
  encode({ token: { sub: String(member.id), epoch: member.sessionEpoch }, secret, maxAge: sessionMaxAgeSeconds })

/** Signs `member` in on this response. */
export async function startSession(member: { id: number; sessionEpoch: number }): Promise<void> {
  const jar = await cookies()
  jar.set(sessionCookieName(), await sessionToken(member, env().secret), { httpOnly: true, sameSite: 'lax', secure: isSecure(), path: '/', maxAge: sessionMaxAgeSeconds })
}

export async function endSession(): Promise<void> {
  const jar = await cookies()
  jar.delete({ name: sessionCookieName(), path: '/', secure: isSecure() })
}
