// Somebody was faster: the present version stands here, yours stays in the form below. Nothing is lost.
import { Prose } from '@/components/prose/prose'
import { NoticeLine } from '@/components/ui/notice-line'

export function ConflictNotice({ revision, author, html, title }: { revision: string; author: string; html: string; title?: string }) {
  return (
    <section className="conflict" aria-label={`Present version, Rev ${revision}`}>
      <NoticeLine boxed>Rev {revision} by {author} was posted while you wrote. Read it, take over what you want; posting again makes the next revision from your text.</NoticeLine>
      {title ? <h3>{title}</h3> : null}
      <Prose html={html} small />
    </section>
  )
}
