// The log of a section: the form for a new line first, since that is what one comes for; then the lines, one of them perhaps being changed.
import { randomUUID } from 'node:crypto'
import { LogForm } from '@/components/builds/log-form'
import { LogList } from '@/components/builds/log-list'
import { RivetLine } from '@/components/layout/rivet-line'
import { Disclosure } from '@/components/ui/disclosure'
import { isoDate } from '@/lib/format/date'
import { formatHours } from '@/lib/format/hours'
import { paths } from '@/lib/paths'
import type { BuildSection } from '@/lib/schemas/builds'
import { addLogLineAction, changeLogLineAction } from '../../actions'

export function SectionLog({ section, change, now }: { section: BuildSection; change: string | undefined; now: number }) {
  const { build, code, log } = section
  const hidden = { buildId: build.id, section: code }
  const line = log.find((l) => String(l.id) === change)
  const form = line ? { lineId: line.id, content: <LogForm action={changeLogLineAction} id="change" button="Write it anew" hidden={{ ...hidden, lineId: line.id }} initial={{ ...line, hours: formatHours(line.minutes) }} /> } : null
  return (
    <section className="grid gap-4" aria-labelledby="log">
      <RivetLine title="Log" id="log" note={`${formatHours(section.minutes)} so far`} />
      <Disclosure summary="Write in the log" open={log.length === 0 || section.state === 'in-work'}>
        <LogForm action={addLogLineAction} id="log-line" button="Write it" hidden={{ ...hidden, key: randomUUID() }} initial={{ day: isoDate(now) }} />
      </Disclosure>
      {log.length > 0 ? <LogList lines={log} form={form} changeAt={(l) => paths.changeLogLine(build.id, code, l.id)} /> : null}
    </section>
  )
}
