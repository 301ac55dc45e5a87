// The brief that an address names, for its page and its print; what is not there is the page of what is not there.
import 'server-only'
import { notFound } from 'next/navigation'
import type { AppContext } from '@/lib/context'
import { AppError } from '@/lib/errors'
import { pathSegment } from '@/lib/http/path-segment'
import { getBrief } from '@/lib/services/briefs/get-brief'
import type { Brief } from '@/lib/schemas/brief'

export async function requireBrief(context: AppContext, { kit, section }: { kit: string; section: string }): Promise<Brief> {
  const code = pathSegment(section)
  if (code === null) notFound()
  try {
    return await getBrief(context, kit, code)
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  }
}
