// The grouped plate at the head of a brief: every topic once, with the tasks at which it stands.
import { CautionPlate } from '@/components/cautions/caution-plate'
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import type { Brief } from '@/lib/schemas/brief'

const mostNamed = 4

export function BriefPlate({ brief }: { brief: Brief }) {
  const tasks = [...brief.tasks, ...brief.unplaced].map((t) => ({ where: t.title, cautions: t.cautions }))
  // Posts behind the order may stand in other sections: theirs are on the plate too, at no task.
  const plate = groupCautions([...tasks, { where: '', cautions: brief.cautions }])
  if (!plate) return null
  return <CautionPlate brief cautions={plate.lines.map((line) => ({ ...line, where: whereWords(line.where.filter((w) => w !== '')) }))} />
}

function whereWords(titles: readonly string[]): string | undefined {
  if (titles.length === 0) return undefined
  return titles.length <= mostNamed ? titles.join(', ') : `at ${titles.length} tasks`
}
