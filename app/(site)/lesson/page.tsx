// A lesson after a section: what happened, what I would do differently, tools, order advice.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { EntryForm } from '@/components/entries/entry-form'
import { PageTitle } from '@/components/layout/page-title'
import { memberContext } from '@/lib/auth/guards'
import { listHardware } from '@/lib/services/entries/get-writing-page'
import { listPlaces } from '@/lib/services/kits/list-places'
import { carriedWords } from '../carried-words'
import { lessonAction } from '../entries/write-actions'

export const metadata: Metadata = { title: 'Write a lesson' }

export default async function LessonPage({ searchParams }: PageProps<'/lesson'>) {
  const context = await memberContext()
  const [places, hardware, words] = [await listPlaces(context), await listHardware(context), await searchParams]
  return (
    <div className="writing page-body">
      <PageTitle title="Write a lesson" lead="What happened, and what you would do differently: the next builder reads it before they begin." />
      <EntryForm action={lessonAction} kind="lesson" places={{ ...places, hardware }} initial={carriedWords(words)} submission={randomUUID()} memberId={context.actor.id} />
    </div>
  )
}
