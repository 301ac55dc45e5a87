// Framework settings only. Everything that depends on the installation is read by lib/env.ts.
import type { NextConfig } from 'next'

const config: NextConfig = {
  typedRoutes: true,
  poweredByHeader: false,
  reactStrictMode: true,
  // forbidden() and unauthorized() are called from lib/auth/guards.ts alone, so that dropping this touches one file.
  // The framework's 1 MB would answer a long text with the error page; up to here our own limits refuse it in words, beside the field.
  experimental: { authInterrupts: true, serverActions: { bodySizeLimit: '4mb' } },
  serverExternalPackages: ['@node-rs/argon2'],
  logging: { incomingRequests: false },
}

export default config
