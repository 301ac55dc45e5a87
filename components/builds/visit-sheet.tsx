// The visit sheet of a section: for a mentor or an inspector, on a screen or on paper. What stands, what is held, what is gone by, what was done, what closes.
import { RivetLine } from '@/components/layout/rivet-line'
import { CautionPlate } from '@/components/cautions/caution-plate'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { stateWords } from '@/lib/format/build-words'
import { formatHours } from '@/lib/format/hours'
import type { BuildSection } from '@/lib/schemas/builds'
import { ClosingList } from './closing-list'
import { GoneByList } from './gone-by-list'
import { HoldCard } from './hold-card'
import { LogList } from './log-list'

export function VisitSheet({ section }: { section: BuildSection }) {
  const open = section.holds.filter((h) => h.released === null)
  return (
    <>
      <CautionPlate cautions={unionCautions(section.goingBy.map((g) => g.cautions)).filter((c) => !c.waived)} />
      <p>{stateWords[section.state]} · {formatHours(section.minutes)} in {section.log.length} log lines.</p>
      <RivetLine title="Held and left open" />
      {open.length + section.openUntilHere.length === 0 ? <p className="text-ink-soft">Nothing is held here.</p> : <div className="hold-cards">{[...open, ...section.openUntilHere].map((h) => <HoldCard key={h.id} hold={h} />)}</div>}
      <RivetLine title="Gone by" />
      {section.goingBy.length === 0 ? <p className="text-ink-soft">No advice is marked as gone by here.</p> : <GoneByList items={section.goingBy} />}
      {section.closing.length > 0 ? <><RivetLine title="Closing list" /><ClosingList lines={section.closing} /></> : null}
      <RivetLine title="Log" />
      {section.log.length === 0 ? <p className="text-ink-soft">Nothing in the log yet.</p> : <LogList lines={section.log} />}
    </>
  )
}
