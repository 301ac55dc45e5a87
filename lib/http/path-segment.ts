// A part of an address, as text.
import 'server-only'

/** The decoded segment; null when it is not percent-encoded UTF-8, since nothing can be there. */
export function pathSegment(segment: string): string | null {
  try {
    return decodeURIComponent(segment)
  } catch {
    return null
  }
}
