// Order advice: this task before that one.
import { PartTag } from '@/components/entries/part-tag'

export function OrderAdvice({ advice, titles }: { advice: readonly { before: string; after: string }[]; titles: ReadonlyMap<string, string> }) {
  if (advice.length === 0) return null
  return (
    <section className="lesson-part">
      <h2>Order</h2>
      <ul className="order-advice">
        {advice.map((o) => <li key={`${o.before} ${o.after}`}><PartTag title={titles.get(o.before) ?? o.before} /> before <PartTag title={titles.get(o.after) ?? o.after} /></li>)}
      </ul>
    </section>
  )
}
