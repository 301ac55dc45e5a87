// Everybody with an account, for stewards: role, state and mentorship at a glance, and one member open to be changed.
import type { Metadata } from 'next'
import Link from 'next/link'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import { PageTitle } from '@/components/layout/page-title'
import { MemberStateForm, MentorshipForm, RoleForm, type CaredFor } from '@/components/people/member-care'
import { roleWords, stateWords } from '@/components/people/role-words'
import { DateText } from '@/components/ui/date-text'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { requireCan } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import type { Member } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'
import { listPeople, type ListedMember } from '@/lib/services/people/list-people'
import { endMentorshipAction, grantMentorshipAction, setMemberStateAction, setRoleAction } from './actions'

export const metadata: Metadata = { title: 'People' }

export default async function PeoplePage({ searchParams }: PageProps<'/people'>) {
  const context = await requireCan('people.open')
  const [people, query] = await Promise.all([listPeople(context), searchParams])
  const open = people.find((p) => String(p.id) === query.open)
  return (
    <>
      <PageTitle title="People" lead="Roles are a ladder of care. Mentorship stands beside it: you grant it, to somebody else." aside={<><span className="block">{people.length} with an account</span><Link className="block" href={paths.evidence}>Time to an answer</Link></>} />
      {open ? <OpenMember actor={context.actor} member={open} /> : null}
      <PeopleTable people={people} openId={open?.id} />
    </>
  )
}

function PeopleTable({ people, openId }: { people: readonly ListedMember[]; openId: number | undefined }) {
  return (
    <div className="sheet relative overflow-x-auto" role="group" aria-label="Table of people" tabIndex={0}>
      <table className="w-full text-left">
        <caption className="sr-only">Everybody with an account, by name</caption>
        <thead className="bg-inset">
          <tr>{['Name', 'E-mail', 'Role', 'Mentor', 'Since', 'Change'].map((head) => <th key={head} scope="col" className="label px-4 py-3">{head}</th>)}</tr>
        </thead>
        <tbody>
          {people.map((p) => (
            <tr key={p.id} className="border-t border-line align-baseline">
              <th scope="row" className="px-4 py-3 font-bold"><Link href={paths.person(p.id)}>{p.name}</Link></th>
              <td className="px-4 py-3 break-all">{p.email}</td>
              <td className="px-4 py-3">{roleWords[p.role]}{p.state === 'active' ? '' : `, ${stateWords[p.state]}`}</td>
              <td className="px-4 py-3">{p.mark === null ? <span className="text-ink-soft">no</span> : <><b className="code">{p.mark}</b> <span className="text-small text-ink-soft">{p.fields}</span></>}</td>
              <td className="px-4 py-3"><DateText at={p.createdAt} /></td>
              <td className="px-4 py-2">{p.id === openId ? <span className="text-ink-soft">open above</span> : <LinkButton href={paths.people(p.id)} small>Change<span className="sr-only"> {p.name}</span></LinkButton>}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

/** The forms for one member; what the policy refuses is absent, with the reason. */
function OpenMember({ actor, member }: { actor: Member; member: ListedMember }) {
  const person: CaredFor = { id: member.id, name: member.name, role: member.role, state: member.state === 'active' ? 'active' : 'suspended', mark: member.mark }
  const maySetState = can(actor, 'people.set-state', { memberId: person.id, role: person.role })
  const mayGrant = can(actor, 'people.grant-mentorship', { memberId: person.id })
  return (
    <Sheet as="section" labelledBy="open-member">
      <SheetHead title={person.name} id="open-member" note={[roleWords[person.role], stateWords[person.state], person.mark ?? ''].filter(Boolean).join(' · ')} />
      <div className="sheet-body lg:grid-cols-3">
        <section className="grid content-start gap-3"><h3 className="label">Role</h3><RoleForm action={setRoleAction} person={person} /></section>
        <section className="grid content-start gap-3">
          <h3 className="label">Mentorship</h3>
          {mayGrant ? <MentorshipForm grantAction={grantMentorshipAction} endAction={endMentorshipAction} person={person} /> : <NoticeLine>Nobody grants or ends their own mentorship: another steward does.</NoticeLine>}
        </section>
        <section className="grid content-start gap-3">
          <h3 className="label">{person.state === 'active' ? 'Suspension' : 'Suspended'}</h3>
          {maySetState ? <MemberStateForm action={setMemberStateAction} person={person} /> : <NoticeLine>Nobody suspends themselves.</NoticeLine>}
        </section>
      </div>
      <div className="sheet-foot"><LinkButton href={paths.people()} look="quiet">Close</LinkButton></div>
    </Sheet>
  )
}
