// The end of a brief: hours, tools, and what can no longer be reached once the section is closed.
import { HoursDistribution, hoursWords } from '@/components/charts/hours-distribution'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { builderWords } from '@/lib/format/brief-order-words'
import type { Brief } from '@/lib/schemas/brief'

const mostTools = 10
const origins = { plans: 'from the plans', builder: 'from a builder', inspector: 'from an inspector' } as const

export function BriefFoot({ brief: { hours, tools, closing } }: { brief: Brief }) {
  const named = tools.some((t) => t.builders > 1) ? tools.filter((t) => t.builders > 1) : tools
  return (
    <div className="brief-foot">
      <Sheet as="section" labelledBy="hours">
        <SheetHead id="hours" title="Hours" note={hours ? builderWords(hours.builders) : null} />
        <div className="sheet-body">
          {hours ? <><HoursDistribution hours={hours} /><p className="brief-note">{hoursWords(hours)}</p></> : <p>Fewer than three builders have told their hours.</p>}
        </div>
      </Sheet>
      {named.length > 0 ? (
        <Sheet as="section" labelledBy="tools">
          <SheetHead id="tools" title="Tools" note={named === tools ? 'named in lessons' : 'named by 2 or more'} />
          <ul className="brief-list">
            {named.slice(0, mostTools).map((tool) => <li key={tool.name}><span>{tool.name}</span><b className="code">{tool.builders}</b></li>)}
          </ul>
        </Sheet>
      ) : null}
      {closing.length > 0 ? (
        <Sheet as="section" labelledBy="closing">
          <SheetHead id="closing" title="Closing list" note="out of reach once closed" />
          <ul className="brief-list">
            {closing.map((line) => <li key={line.text}><span>{line.text} <span className="brief-note">{[origins[line.origin], line.reference].filter(Boolean).join(', ')}</span></span></li>)}
          </ul>
        </Sheet>
      ) : null}
    </div>
  )
}
