// "Do not go past step X until Y", and what is left open on purpose until a later section. Made once however often it is sent.
import 'server-only'
import { randomBytes } from 'node:crypto'
import type { Transaction } from '@/db/client'
import { insertHold } from '@/db/mutations/builds'
import { getHold } from '@/db/queries/builds'
import { getSection } from '@/db/queries/kits'
import { write } from '@/db/transaction'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Hold, NewHold } from '@/lib/schemas/builds'
import { presentHold } from './present-hold'
import { requireBuildSection } from './require-build'

/** Stands in the printed code: 128 bits, url-safe. */
export const newHoldCode = (): string => randomBytes(16).toString('base64url')

/** The same key again gives the hold that is there. */
export async function addHold({ database, actor, now }: AppContext, buildId: number, code: string, input: NewHold): Promise<Hold> {
  return write(database, { actorId: actor?.id ?? null, at: now }, async (tx, record) => {
    const { section, kit } = await requireBuildSection(tx, actor, buildId, code)
    const before = await getHold(tx, { buildId, key: input.key })
    if (before) {
      record('nothing', `build:${buildId}`)
      return presentHold(before)
    }
    const { untilSection, ...words } = input
    const until = untilSection === '' ? null : await laterSection(tx, kit.slug, section, untilSection)
    const id = await insertHold(tx, { buildId, sectionId: section.id, ...words, until: words.until || `section ${untilSection}`, untilSectionId: until, code: newHoldCode(), createdAt: now })
    record('hold.make', `build:${buildId}`, `hold:${id}`)
    const made = await getHold(tx, { buildId, id })
    if (!made) throw new Error('The hold was not inserted')
    return presentHold(made)
  })
}

/** The section until which it stays open: of the same kit, another one. Builders work in an order of their own, so it need not come later in the plans. */
async function laterSection(tx: Transaction, kitSlug: string, here: { id: number }, code: string): Promise<number> {
  const found = await getSection(tx, kitSlug, code)
  if (!found) throw refuse.invalid('untilSection', 'The kit has no such section.')
  if (found.section.id === here.id) throw refuse.invalid('untilSection', 'Choose another section than this one.')
  return found.section.id
}
