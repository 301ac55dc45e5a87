// A computed answer above the hits of a search: the drawing, the number with its source, what was understood, the other readings.
import type { Route } from 'next'
import Link from 'next/link'
import { Sheet } from '@/components/entries/sheet'
import type { FirstSystem } from '@/lib/format/shop-words'
import type { ShopAnswer } from '@/lib/schemas/shop'
import type { KeyedPost } from './balloon-notes'
import { ShopAnswerView } from './shop-answer-view'

export function ComputedAnswer({ answer, first, posts }: { answer: ShopAnswer; first: FirstSystem; posts: readonly KeyedPost[] }) {
  return (
    <Sheet as="section" className="computed-answer">
      <h2 className="sr-only">Worked out: {answer.readAs}</h2>
      <div className="sheet-body"><ShopAnswerView answer={answer} first={first} posts={posts} /></div>
      <p className="sheet-foot">
        Read as {answer.readAs}.{answer.alternatives.map((other) => <span key={other.url}> <Link href={other.url as Route}>I meant {other.label}</Link>.</span>)} <Link href={answer.url as Route}>Open the shop table</Link>
      </p>
    </Sheet>
  )
}
