// Where builders disagree: each side with how many and the posts behind it, and which one the order on the page follows.
import Link from 'next/link'
import type { Route } from 'next'
import { followedWords, sideWords } from '@/lib/format/brief-order-words'
import type { Brief } from '@/lib/schemas/brief'
import { CautionMention } from './caution-mention'

export function Dispute({ dispute }: { dispute: Brief['order']['disagreements'][number] }) {
  return (
    <section className="dispute" aria-label={`Builders disagree: ${dispute.tasks.map((t) => t.title).join(', ')}`}>
      <p className="label">Builders disagree here</p>
      <div className="dispute-sides">
        {dispute.sides.map((side) => (
          <div key={`${side.before.slug} ${side.after.slug}`}>
            <h3>{sideWords(side)}</h3>
            <ul>
              {side.posts.map((post) => <li key={post.postId}><Link href={post.url as Route}>{post.title}</Link> <CautionMention cautions={post.cautions} /></li>)}
              {side.posts.length === 0 ? <li>Told in debriefs.</li> : null}
            </ul>
          </div>
        ))}
      </div>
      <p className="brief-note">{followedWords(dispute)}</p>
    </section>
  )
}
