// Everything at one task of a brief, in the order it is needed: its cautions first.
import { CautionLine } from '@/components/cautions/caution-line'
import { departureWords, stepWords } from '@/lib/format/brief-order-words'
import { capital } from '@/lib/format/shop-words'
import type { BriefTask, Said } from '@/lib/schemas/brief'
import { KnowHowRow, LessonRow, OpenRow, SizeRow } from './brief-items'

export function BriefTaskSheet({ task, departures = [], hasBaseLine }: { task: BriefTask, departures?: readonly Said[], hasBaseLine: boolean }) {
  const isEmpty = task.sizes.length + task.knowHow.length + task.lessons.length + task.open.length === 0
  const place = stepWords(task.steps)
  return (
    <article className="brief-task" aria-labelledby={`task-${task.slug}`}>
      <div className="brief-task-head">
        <h2 id={`task-${task.slug}`}>{capital(task.title)}</h2>
        {place ? <span className="code">{place}</span> : hasBaseLine && task.slug !== '' ? <span className="brief-note">not in the plans</span> : null}
      </div>
      {departures.map((d) => <p key={d.after.slug} className="brief-departure">{departureWords(d)}</p>)}
      <CautionLine cautions={task.cautions} />
      {task.sizes.map((size) => <SizeRow key={`${size.table} ${size.expected}`} size={size} />)}
      {task.knowHow.map((item) => <KnowHowRow key={item.postId} item={item} />)}
      {task.lessons.map((lesson) => <LessonRow key={lesson.lead.postId} lesson={lesson} />)}
      {task.open.map((item) => <OpenRow key={item.postId} item={item} />)}
      {isEmpty ? <p className="brief-note">Nothing written here yet.</p> : null}
    </article>
  )
}
