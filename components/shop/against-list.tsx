// What the reader measured and the table doesn't allow, right beside the number: short of an edge distance, too tight a bend.
import { capital } from '@/lib/format/shop-words'
import type { ShopAnswerResult } from '@/lib/schemas/shop'

export function AgainstList({ results }: { results: readonly ShopAnswerResult[] }) {
  const lines = [...new Set(results.flatMap(({ label, against }) => (against ? [`${capital(label)}: ${against}.`] : [])))]
  if (lines.length === 0) return null
  return <ul className="shop-against-list" aria-label="Not within the table">{lines.map((line) => <li key={line}><b>{line}</b></li>)}</ul>
}
