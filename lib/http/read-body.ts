// Reads a request body with a limit, as strict UTF-8 and JSON.
import 'server-only'
import { AppError } from '@/lib/errors'

export const jsonMaxBytes = 1_000_000

/** The bytes of the body. 413 past `maxBytes`, without reading on; 400 when it breaks off. */
export async function readBytes(request: Request, maxBytes: number): Promise<Uint8Array> {
  const tooLarge = () => new AppError('too-large', `At most ${maxBytes.toLocaleString('en')} bytes.`)
  if (Number(request.headers.get('content-length') ?? 0) > maxBytes) throw tooLarge()
  const pieces: Uint8Array[] = []
  let size = 0
  try {
    for await (const piece of request.body ?? []) {
      size += piece.byteLength
      if (size > maxBytes) throw tooLarge()
      pieces.push(piece)
    }
  } catch (error) {
    // Who went away in the middle of sending made no error of ours.
    throw error instanceof AppError ? error : new AppError('malformed', 'The body did not arrive whole.')
  }
  return Buffer.concat(pieces)
}

/** The body's text. 400 when it is not UTF-8. */
export function decodeUtf8(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes)
  } catch {
    throw new AppError('malformed', 'The body is not UTF-8.')
  }
}

/** The parsed JSON body and its text. 415 for another content type, 400 for bad UTF-8 or JSON. */
export async function readJson(request: Request): Promise<{ value: unknown; text: string }> {
  const type = request.headers.get('content-type') ?? ''
  if (!/^application\/json(\s*;|$)/i.test(type)) throw new AppError('unsupported-media-type', 'Send application/json.')
  const text = decodeUtf8(await readBytes(request, jsonMaxBytes))
  try {
    return { value: JSON.parse(text) as unknown, text }
  } catch {
    throw new AppError('malformed', 'The body is not JSON.')
  }
}
