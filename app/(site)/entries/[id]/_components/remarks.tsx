// Remarks under a post. A remark shows what its own words require beyond its post's line, which stands right above.
import { randomUUID } from 'node:crypto'
import { CautionLine } from '@/components/cautions/caution-line'
import { RemarkForm } from '@/components/entries/remark-form'
import { Prose } from '@/components/prose/prose'
import { Disclosure } from '@/components/ui/disclosure'
import { formatDate } from '@/lib/format/date'
import type { Answer, Entry } from '@/lib/schemas/post'
import { remarkAction } from '../../actions'

export function Remarks({ post, mayRemark, memberId }: { post: Entry | Answer; mayRemark: boolean; memberId: number }) {
  const known = new Set(post.cautions.filter((c) => !c.waived).map((c) => c.code))
  if (post.remarks.length === 0 && !mayRemark) return null
  return (
    <div className="remarks-part">
      {post.remarks.length > 0 ? (
        <ul className="remarks">
          {post.remarks.map((r) => (
            <li key={r.id} id={`remark-${r.id}`} tabIndex={-1}>
              <p className="label">{r.author.name} · {formatDate(r.createdAt)}</p>
              <CautionLine cautions={r.cautions.filter((c) => !known.has(c.code))} />
              <Prose html={r.html} small />
            </li>
          ))}
        </ul>
      ) : null}
      {mayRemark ? <Disclosure summary="Remark" look="quiet"><RemarkForm action={remarkAction} postId={post.id} submission={randomUUID()} memberId={memberId} key={post.remarks.length} /></Disclosure> : null}
    </div>
  )
}
