// Hold tags for paper: each with a code that opens its hold.
import 'server-only'
import QRCode from 'qrcode'
import { listHolds } from '@/db/queries/builds'
import type { AppContext } from '@/lib/context'
import { refuse } from '@/lib/errors'
import type { Hold } from '@/lib/schemas/builds'
import { isOpen, presentHold } from './present-hold'
import { requireBuild } from './require-build'

export interface HoldTag { hold: Hold; address: string; code: { size: number; path: string } }

/** One open hold, or all of them, oldest first. `origin` begins the address in the code. 404 for everybody but the owner. */
export async function getHoldTags({ reader, actor }: AppContext, buildId: number, holdId: number | null, origin: string) {
  const { build, kit } = await requireBuild(reader, actor, buildId)
  const open = (await listHolds(reader, [buildId])).map(presentHold).filter(isOpen)
  const wanted = holdId === null ? open : open.filter((h) => h.id === holdId)
  if (holdId !== null && wanted.length === 0) throw refuse.notFound('This hold')
  return { build: { id: build.id, name: build.name }, kit, tags: wanted.map((hold): HoldTag => ({ hold, address: `${origin}${hold.url}`, code: codeOf(`${origin}${hold.url}`) })) }
}

/** The dark modules of a QR code as one path, a unit a module. Level M stands a thumbprint of grease. */
function codeOf(text: string): HoldTag['code'] {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' })
  let path = ''
  for (let y = 0; y < modules.size; y++) for (let x = 0; x < modules.size; x++) if (modules.get(y, x)) path += `M${x} ${y}h1v1h-1z`
  return { size: modules.size, path }
}
