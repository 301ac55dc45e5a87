// A brief from its plate to its closing list. The head of the page and who may see it are the page's.
import { OrderStrip } from '@/components/order/order-strip'
import { StripKey } from '@/components/order/strip-key'
import { RivetLine } from '@/components/layout/rivet-line'
import { PlansWin } from '@/components/layout/plans-win'
import { Sheet } from '@/components/entries/sheet'
import { originWords } from '@/lib/format/brief-order-words'
import type { Brief } from '@/lib/schemas/brief'
import { BriefFoot } from './brief-foot'
import { BriefPlate } from './brief-plate'
import { BriefTaskSheet } from './brief-task-sheet'
import { Dispute } from './dispute'

const asLine = ({ before, after, builders }: { before: { slug: string }, after: { slug: string }, builders: number }) => ({ before: before.slug, after: after.slug, builders })

export function BriefSheet({ brief }: { brief: Brief }) {
  const { order, tasks, unplaced } = brief
  const byName = new Map(tasks.map((t) => [t.slug, t]))
  const bodyOf = (slug: string) => {
    const task = byName.get(slug)
    return task ? <BriefTaskSheet task={task} hasBaseLine={order.hasBaseLine} departures={order.departures.filter((d) => d.before.slug === slug)} /> : null
  }
  return (
    <>
      <BriefPlate brief={brief} />
      <PlansWin maker={brief.kit.maker} />
      <p className="brief-note">{originWords(order)}</p>
      {tasks.length > 0 ? (
        <>
          <StripKey hasBaseLine={order.hasBaseLine} hasDepartures={order.departures.length > 0} hasDisputes={order.disagreements.length > 0} />
          <OrderStrip tasks={tasks.map((t) => ({ slug: t.slug, isInPlans: t.isInPlans || !order.hasBaseLine }))} departures={order.departures.map(asLine)} straightOn={order.straightOn} bodyOf={bodyOf}
            disputes={order.disagreements.map((d) => ({ tasks: d.tasks.map((t) => t.slug), counts: d.sides.map((s) => s.builders), body: <Dispute dispute={d} /> }))} />
        </>
      ) : null}
      {unplaced.length > 0 ? (
        <>
          {tasks.length > 0 ? <RivetLine title="No place in the order yet" /> : null}
          <Sheet>{unplaced.map((task) => <div key={task.slug} className="brief-unplaced"><BriefTaskSheet task={task} hasBaseLine={false} /></div>)}</Sheet>
        </>
      ) : null}
      {brief.postsLeftOut > 0 ? <p className="brief-note">{brief.postsLeftOut} more posts of this section are not shown here: the section has them all.</p> : null}
      <BriefFoot brief={brief} />
    </>
  )
}
