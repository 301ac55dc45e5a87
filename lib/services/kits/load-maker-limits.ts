// A kit's own limits in force, as the shop tables and the numbers check take them: each names its maker.
import 'server-only'
import type { ReaderOrTransaction } from '@/db/client'
import { listLimitsInForce } from '@/db/queries/kit-limits'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import { refuse } from '@/lib/errors'

/** None without a kit, and none for a kit that isn't there. `table`: only those of one shop table. */
export async function loadMakerLimits(reader: ReaderOrTransaction, kit: string | null | undefined, table?: string): Promise<MakerLimit[]> {
  return kit ? ((await limitsOf(reader, kit, table)) ?? []) : []
}

/** The same where a kit is named on purpose: 422 with the path `kit` when it isn't there. */
export async function requireMakerLimits(reader: ReaderOrTransaction, kit: string | undefined, table?: string): Promise<MakerLimit[]> {
  if (kit === undefined) return []
  const found = await limitsOf(reader, kit, table)
  if (!found) throw refuse.invalid('kit', 'There is no kit of this name. GET /api/kits lists them.')
  return found
}

async function limitsOf(reader: ReaderOrTransaction, slug: string, table?: string): Promise<MakerLimit[] | null> {
  const found = await listLimitsInForce(reader, slug, table)
  return found && found.limits.map(({ table, result, inputs, value, unit, display, reference, note }) => ({
    table, result, inputs, value, unit, display, reference: { ...reference, title: named(found.kit.maker, reference.title) }, ...(note ? { note } : {}),
  }))
}

/** "Saltmarsh Aircraft: Bulletin SB-07". */
const named = (maker: string, title: string): string => (title.startsWith(maker) ? title : `${maker}: ${title}`)
