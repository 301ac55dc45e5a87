// Sign in with e-mail and password, and go on to where one came from.
import type { Metadata } from 'next'
import Link from 'next/link'
import { PageTitle } from '@/components/layout/page-title'
import { SignOutForm } from '@/components/people/sign-out-form'
import { EmptyState } from '@/components/ui/empty-state'
import { FieldsForm } from '@/components/ui/fields-form'
import { LinkButton } from '@/components/ui/link-button'
import { NoticeLine } from '@/components/ui/notice-line'
import { currentActor } from '@/lib/auth/current-user'
import { paths } from '@/lib/paths'
import { sitePath } from '@/lib/schemas/people'
import { signInAction, signOutAction } from '../actions'

export const metadata: Metadata = { title: 'Sign in' }

export default async function SignInPage({ searchParams }: PageProps<'/sign-in'>) {
  const [actor, query] = await Promise.all([currentActor(), searchParams])
  const from = typeof query.from === 'string' ? sitePath(query.from) : null
  if (actor) {
    return (
      <>
        <PageTitle title="Sign in" />
        <EmptyState title={`You are signed in as ${actor.name}`} action={<><LinkButton href={from ?? paths.home} look="primary">Go on</LinkButton><SignOutForm action={signOutAction} /></>} />
      </>
    )
  }
  return (
    <>
      <PageTitle title="Sign in" lead="To ask, to say what to do, and to keep what you go by." />
      {query.error === undefined ? null : <NoticeLine boxed live>Signing in did not work. Try again here.</NoticeLine>}
      <FieldsForm action={signInAction} id="sign-in" button="Sign in" look="primary" hidden={from ? { from } : {}} fields={[
        { name: 'email', label: 'E-mail', kind: 'email', autoComplete: 'username', maxLength: 254 },
        { name: 'password', label: 'Password', kind: 'password', autoComplete: 'current-password', maxLength: 200 },
      ]} />
      <p>No account yet? <Link href={paths.signUp()}>Sign up</Link>.</p>
    </>
  )
}
