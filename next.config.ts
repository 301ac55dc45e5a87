// Framework settings only. Everything that depends on the installation is read by lib/env.ts.
import type { NextConfig } from 'next'

const config: NextConfig = {
  typedRoutes: true,
  poweredByHeader: false,
  reactStrictMode: true,
  // forbidden() and unauthorized() are called from lib/auth/guards.ts alone, so that dropping this touches one file.
  experimental: { authInterrupts: true },
  serverExternalPackages: ['@node-rs/argon2'],
  logging: { incomingRequests: false },
}

export default config
