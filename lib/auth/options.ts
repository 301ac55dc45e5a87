// next-auth's settings. Sessions are signed cookies that name a member; rights are read afresh on every request.
import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import Credentials from 'next-auth/providers/credentials'
import { contextFor } from '@/lib/context'
import { env } from '@/lib/env'
import { logInfo } from '@/lib/log'
import { authenticate } from '@/lib/services/people/authenticate'

export const sessionMaxAgeSeconds = 30 * 24 * 3600

/** Built lazily: env() must not be read while the framework collects page data. */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().secret,
    // Anybody can send a cookie that does not open: one quiet line, not a stack.
    logger: { error: (code) => logInfo('auth.refused', { code }), warn: (code) => logInfo('auth.warning', { code }), debug: () => undefined },
    session: { strategy: 'jwt', maxAge: sessionMaxAgeSeconds },
    useSecureCookies: env().publicUrl.startsWith('https:'),
    pages: { signIn: '/sign-in', error: '/sign-in' },
    providers: [
      Credentials({
        name: 'E-mail and password',
        credentials: { email: {}, password: {} },
        async authorize(credentials, request) {
          const address = String(request.headers?.['x-client-address'] ?? 'unknown')
          const found = await authenticate(await contextFor(null), { email: credentials?.email ?? '', password: credentials?.password ?? '', address })
          return { id: String(found.id), epoch: found.sessionEpoch }
        },
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) => (user ? { sub: String(user.id), epoch: user.epoch } : token),
      session: ({ session, token }) => ({ ...session, user: { id: Number(token.sub), epoch: Number(token['epoch']) } }),
    },
  }
}
