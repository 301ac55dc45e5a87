// Ask: the four parts of a question, with what may already answer it.
import type { Metadata } from 'next'
import { randomUUID } from 'node:crypto'
import { EntryForm } from '@/components/entries/entry-form'
import { PageTitle } from '@/components/layout/page-title'
import { memberContext } from '@/lib/auth/guards'
import { listHardware } from '@/lib/services/entries/get-writing-page'
import { listPlaces } from '@/lib/services/kits/list-places'
import { carriedWords } from '../carried-words'
import { questionAction } from '../entries/write-actions'

export const metadata: Metadata = { title: 'Ask' }

export default async function AskPage({ searchParams }: PageProps<'/ask'>) {
  const context = await memberContext()
  const [places, hardware, words] = [await listPlaces(context), await listHardware(context), await searchParams]
  return (
    <div className="writing page-body">
      <PageTitle title="Ask" lead="Say what you are doing, what the plans say, what you measured and what you tried. Figures with units get better answers." />
      <EntryForm action={questionAction} kind="question" places={{ ...places, hardware }} initial={carriedWords(words)} submission={randomUUID()} memberId={context.actor.id} />
    </div>
  )
}
