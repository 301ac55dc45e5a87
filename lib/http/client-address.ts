// The address a request came from, as the socket says; X-Forwarded-For counts only with TRUST_PROXY.
import 'server-only'
import { subscribe } from 'node:diagnostics_channel'
import type { IncomingMessage } from 'node:http'
import { env } from '@/lib/env'

const header = 'x-client-address'

/**
 * Writes the socket's address into each request before anybody sees it, so that no client can claim another one.
 * The framework only fills X-Forwarded-For when it is absent, which would let clients choose their own.
 */
export function watchClientAddresses(): void {
  subscribe('http.server.request.start', (message) => {
    const { request } = message as { request: IncomingMessage }
    if (!isDecodable(request.url)) request.url = unreadableAddress
    const forwarded = env().TRUST_PROXY ? String(request.headers['x-forwarded-for'] ?? '').split(',').at(-1)?.trim() : undefined
    request.headers[header] = forwarded || request.socket.remoteAddress || 'unknown'
  })
}

/** Where a request goes whose address is not percent-encoded UTF-8: the framework would answer it with an error of its own. */
const unreadableAddress = '/api/unreadable-address'

function isDecodable(url: string | undefined): boolean {
  try {
    decodeURIComponent((url ?? '').split('?')[0] ?? '')
    return true
  } catch {
    return false
  }
}

export const clientAddress = (headers: Headers): string => headers.get(header) ?? 'unknown'
