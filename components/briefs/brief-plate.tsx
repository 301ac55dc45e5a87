// The grouped plate at the head of a brief: every topic once, with the tasks at which it stands.
import { CautionPlate } from '@/components/cautions/caution-plate'
import { groupCautions } from '@/lib/domain/cautions/group-cautions'
import { capital } from '@/lib/format/shop-words'
import type { Brief } from '@/lib/schemas/brief'

const mostNamed = 4

export function BriefPlate({ brief }: { brief: Brief }) {
  const tasks = [...brief.tasks, ...brief.unplaced].map((t) => ({ where: t.title, cautions: t.cautions }))
  // Posts behind the order may stand in other sections: theirs are on the plate too, at no task.
  const plate = groupCautions([...tasks, { where: '', cautions: brief.cautions }])
  if (!plate) return null
  return <div className="brief-plate"><CautionPlate cautions={plate.lines.map((line) => ({ ...line, text: textOf(line, brief.cautions), where: whereWords(line.where.filter((w) => w !== '')) }))} /></div>
}

/** Every WARNING in full; of the others their short words, or the plate would push the first task off the first page of paper. */
function textOf({ topic }: { topic: string }, cautions: Brief['cautions']): string {
  const [worst, ...others] = cautions.filter((c) => c.topic === topic)
  if (!worst) return ''
  const words = (c: Brief['cautions'][number]) => (c.signalWord === 'WARNING' ? c.text : c.short)
  return [worst.signalWord === 'WARNING' ? worst.text : withoutTopic(worst.short), ...others.map(words)].join(' ')
}

/** A short text begins with its topic ("Eyes: safety glasses …"), which the plate prints by itself. */
const withoutTopic = (short: string): string => capital(short.replace(/^[^:]{1,40}:\s*/u, ''))

function whereWords(titles: readonly string[]): string | undefined {
  if (titles.length === 0) return undefined
  return titles.length <= mostNamed ? titles.join(', ') : `at ${titles.length} tasks`
}
