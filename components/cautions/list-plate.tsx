// One plate for a list of posts: a short line a topic, with on how many of them it stands; the full texts head each entry.
// A list has to leave room for what was looked up.
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import type { Caution } from '@/lib/schemas/post'
import { CautionPlate } from './caution-plate'

export interface ListPlateProps {
  items: readonly { readonly id: number; readonly cautions: readonly Caution[] }[]
  /** Cautions of a computed answer on the same page. */
  also?: readonly Caution[]
}

export function ListPlate({ items, also = [] }: ListPlateProps) {
  const standing = items.map((item) => ({ where: String(item.id), cautions: item.cautions.filter((c) => !c.waived) }))
  const plate = groupCautions([...standing, { where: '', cautions: also }])
  if (!plate) return null
  const short = new Map([...also, ...items.flatMap((item) => item.cautions)].map((c) => [c.code, c.short] as const))
  return (
    <CautionPlate brief cautions={plate.lines.map((line) => {
      const on = line.where.filter((w) => w !== '').length
      const where = items.length === 1 || on === 0 ? undefined : `${on} of ${items.length}`
      return { ...line, text: withoutTopic(short.get(line.code) ?? line.text), where }
    })} />
  )
}

/** A short text begins with its topic ("Eyes: safety glasses …"), which the plate prints by itself. */
function withoutTopic(short: string): string {
  const rest = short.replace(/^[^:]{1,40}:\s*/, '')
  return rest.charAt(0).toUpperCase() + rest.slice(1)
}
