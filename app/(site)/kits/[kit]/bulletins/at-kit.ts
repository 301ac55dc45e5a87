// The kit of an address, for the pages below it.
import { notFound } from 'next/navigation'
import { AppError } from '@/lib/errors'
import { pathSegment } from '@/lib/http/path-segment'

/** What `load` gives for the kit of this address; the page that says so when it is not there. */
export async function atKit<T>(params: Promise<{ kit: string }>, load: (kit: string) => Promise<T>): Promise<T> {
  const slug = pathSegment((await params).kit)
  if (slug === null) notFound()
  try {
    return await load(slug)
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  }
}
