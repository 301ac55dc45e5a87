// Kit and section code of an address, decoded, for the pages below a section.
import { notFound } from 'next/navigation'
import { AppError } from '@/lib/errors'
import { pathSegment } from '@/lib/http/path-segment'

/** What `load` gives for the section of this address; the page that says so when it is not there. */
export async function atSection<T>(params: Promise<{ kit: string; section: string }>, load: (kit: string, code: string) => Promise<T>): Promise<T> {
  const { kit, section } = await params
  const [kitSlug, code] = [pathSegment(kit), pathSegment(section)]
  if (kitSlug === null || code === null) notFound()
  try {
    return await load(kitSlug, code)
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  }
}
