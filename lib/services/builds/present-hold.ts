// A hold's row -> the Hold of the API and the pages.
import 'server-only'
import type { HoldRow } from '@/db/queries/builds'
import { holdNumber } from '@/lib/format/build-words'
import { paths } from '@/lib/paths'
import type { Hold } from '@/lib/schemas/builds'

export function presentHold({ hold, ordinal, section, until }: HoldRow): Hold {
  const { id, kind, buildId, what, page, step, notWaiting, releasedAt, releaseNote } = hold
  return {
    id, number: holdNumber(kind, ordinal), kind, buildId, section: { code: section.code, title: section.title }, what, page, step,
    until: hold.until, notWaiting, untilSection: until, createdAt: new Date(hold.createdAt).toISOString(),
    released: releasedAt === null ? null : { at: new Date(releasedAt).toISOString(), note: releaseNote }, url: paths.hold(hold.code),
  }
}

export const isOpen = (hold: Hold): boolean => hold.released === null
