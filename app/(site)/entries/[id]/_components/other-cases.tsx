// Other cases hang on the part, at the foot. A bare title carries at least its signal word and topic.
import { TagRail } from '@/components/entries/hung-tag'
import { RivetLine } from '@/components/layout/rivet-line'
import type { Hit } from '@/lib/schemas/search'
import type { Route } from 'next'

const states = { none: 'Not stamped', imported: 'Imported stamp', 'one-of-two': '1 of 2 stamps', stamped: 'Stamped', lapsed: 'Stamp lapsed', 'plans-changed': 'Plans changed', 'in-question': 'In question', withdrawn: 'Stamp withdrawn' } as const

export function OtherCases({ hits }: { hits: readonly Hit[] }) {
  if (hits.length === 0) return null
  return (
    <section aria-labelledby="other-cases" className="page-body no-print">
      <RivetLine title="Other cases" id="other-cases" note="like this one" />
      <TagRail label="Other cases" tags={hits.map((hit) => {
        const worst = hit.cautions.find((c) => !c.waived)
        return {
          label: hit.open ? 'Open question' : states[hit.stamp], title: hit.title, href: hit.url as Route, code: hit.sections[0],
          note: worst ? `${worst.signalWord}: ${worst.title}` : hit.partTags.find((t) => t.code)?.title, inQuestion: hit.stamp === 'in-question',
        }
      })} />
    </section>
  )
}
