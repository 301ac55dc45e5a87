// A body that is a file, read whole before anything is done with it, so that a refused one leaves nothing behind.
import 'server-only'
import { AppError, refuse } from '@/lib/errors'
import type { Actor } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'
import { readBytes } from './read-body'

/** Content types in lower case, the most it may weigh, and what one must be allowed to do. */
export interface Upload { types: readonly string[]; maxBytes: number; act: 'import' }

/** The bytes. 403 before they are read, 415 for another content type, 413 past the limit. */
export async function readUpload(request: Request, { types, maxBytes, act }: Upload, actor: Actor): Promise<Uint8Array> {
  if (!can(actor, act)) throw refuse.forbidden(whyNot[act])
  const type = (request.headers.get('content-type') ?? '').split(';')[0]?.trim().toLowerCase() ?? ''
  if (!types.includes(type)) throw new AppError('unsupported-media-type', `Send ${types.join(' or ')}.`)
  return readBytes(request, maxBytes)
}
