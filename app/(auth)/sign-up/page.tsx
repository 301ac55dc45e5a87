// Sign up: name, e-mail, password. Where a group takes members by invitation it says how.
import type { Metadata } from 'next'
import Link from 'next/link'
import { PageTitle } from '@/components/layout/page-title'
import { EmptyState } from '@/components/ui/empty-state'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { currentActor } from '@/lib/auth/current-user'
import { env } from '@/lib/env'
import { paths } from '@/lib/paths'
import { sitePath } from '@/lib/schemas/people'
import { signUpClosed } from '@/lib/services/people/sign-up'
import { signUpAction } from '../actions'

export const metadata: Metadata = { title: 'Sign up' }

export default async function SignUpPage({ searchParams }: PageProps<'/sign-up'>) {
  const [actor, query] = await Promise.all([currentActor(), searchParams])
  const from = typeof query.from === 'string' ? sitePath(query.from) : null
  if (actor) return <><PageTitle title="Sign up" /><EmptyState title={`You are signed in as ${actor.name}`} action={<LinkButton href={paths.home} look="primary">Go on</LinkButton>} /></>
  if (!env().SIGN_UP) return <><PageTitle title="Sign up" /><EmptyState title="By invitation" action={<LinkButton href={paths.signIn()}>Sign in</LinkButton>}><p>{signUpClosed}</p></EmptyState></>
  return (
    <>
      <PageTitle title="Sign up" lead="Your name stands beside what you write. Your e-mail is shown to stewards alone." />
      <FieldsForm action={signUpAction} id="sign-up" button="Sign up" look="primary" hidden={from ? { from } : {}} fields={[
        { name: 'name', label: 'Name', autoComplete: 'name', maxLength: 80, help: 'As other builders shall know you.' },
        { name: 'email', label: 'E-mail', kind: 'email', autoComplete: 'username', maxLength: 254 },
        { name: 'password', label: 'Password', kind: 'password', autoComplete: 'new-password', maxLength: 200, help: 'At least 10 characters. A few words in a row do well.' },
      ]} />
      <p>You have an account? <Link href={paths.signIn(from ?? undefined)}>Sign in</Link>.</p>
    </>
  )
}
