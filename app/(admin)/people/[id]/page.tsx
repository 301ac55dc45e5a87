// A member's sheet: who they are, whether they stamp and in which fields, what they wrote lately.
import type { Metadata } from 'next'
import Link from 'next/link'
import { CautionLine } from '@/components/cautions/caution-line'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { TitleBlock } from '@/components/entries/title-block'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { MemberStateForm } from '@/components/people/member-care'
import { roleWords, stateWords } from '@/components/people/role-words'
import { EmptyState } from '@/components/ui/empty-state'
import { DateText } from '@/components/ui/date-text'
import { pageContext } from '@/lib/auth/guards'
import type { AppContext } from '@/lib/context'
import { formatDate } from '@/lib/format/date'
import { orNotFound } from '@/lib/http/or-not-found'
import { paths } from '@/lib/paths'
import { can } from '@/lib/policy/can'
import { getPerson, type PersonSheet, type WrittenLine } from '@/lib/services/people/get-person'
import { setMemberStateAction } from '../actions'

async function load(params: Promise<{ id: string }>): Promise<{ context: AppContext; person: PersonSheet }> {
  const context = await pageContext()
  return { context, person: await orNotFound((await params).id, (id) => getPerson(context, id)) }
}

export async function generateMetadata({ params }: PageProps<'/people/[id]'>): Promise<Metadata> {
  return { title: (await load(params)).person.name }
}

export default async function PersonPage({ params }: PageProps<'/people/[id]'>) {
  const { context, person } = await load(params)
  // That an account is closed explains the name; a suspension is between the member and those who look after the group.
  const state = person.state === 'closed' || mayCare(context, person) ? stateWords[person.state] : ''
  return (
    <>
      <PageTitle title={person.name} {...(person.bio ? { lead: person.bio } : {})} />
      <TitleBlock alone cells={[
        { label: 'Role', value: [roleWords[person.role], state].filter(Boolean).join(', ') },
        ...(person.mentor ? [{ label: 'Stamps as', value: <b className="code">{person.mentor.mark}</b> }, { label: 'Fields', value: person.mentor.fields, width: 'long' as const }, { label: 'Mentor since', value: formatDate(person.mentor.since) }] : []),
        { label: 'Here since', value: formatDate(person.createdAt) },
      ]} />
      <Care context={context} person={person} />
      <RivetLine title="Written lately" />
      {person.written.length === 0
        ? <EmptyState title="Nothing yet" level={3}><p>Questions, lessons and what to do will stand here.</p></EmptyState>
        : <ul className="sheet divide-y divide-line">{person.written.map((line) => <li key={line.postId} className="grid gap-1.5 px-5 py-4"><Written line={line} /></li>)}</ul>}
    </>
  )
}

const kindWords = { question: 'Question', lesson: 'Lesson', answer: 'What to do' } as const

function Written({ line }: { line: WrittenLine }) {
  return (
    <>
      <p className="label">{kindWords[line.kind]} · <DateText at={line.createdAt} /></p>
      <h3 className="text-heading"><Link href={paths.entry(line.entryId, line.postId)}>{line.title}</Link></h3>
      <CautionLine cautions={line.cautions} />
    </>
  )
}

const mayCare = (context: AppContext, person: PersonSheet) => can(context.actor, 'people.set-state', { memberId: person.id, role: person.role })

/** Moderators suspend builders from here; stewards do everything else on their own page. */
function Care({ context, person }: { context: AppContext; person: PersonSheet }) {
  if (person.state === 'closed' || !mayCare(context, person)) return null
  const cared = { id: person.id, name: person.name, role: person.role, state: person.state, mark: person.mentor?.mark ?? null }
  return (
    <Sheet as="section" labelledBy="care">
      <SheetHead title={person.state === 'active' ? 'Suspend this builder' : 'Suspended'} id="care" />
      <div className="sheet-body">
        <MemberStateForm action={setMemberStateAction} person={cared} />
        {can(context.actor, 'people.open') ? <p><Link href={paths.people()}>Roles and mentorships</Link></p> : null}
      </div>
    </Sheet>
  )
}
