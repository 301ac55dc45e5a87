// A member's own account: name and words about themselves, units, password, personal tokens, leaving.
import type { Metadata } from 'next'
import Link from 'next/link'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { SignOutForm } from '@/components/people/sign-out-form'
import { UnitsForm } from '@/components/people/units-form'
import { TokenForm } from '@/components/people/token-form'
import { Disclosure } from '@/components/ui/disclosure'
import { FieldsForm } from '@/components/ui/fields-form'
import { signOutAction } from '@/app/(auth)/actions'
import { memberContext } from '@/lib/auth/guards'
import { formatDate } from '@/lib/format/date'
import { paths } from '@/lib/paths'
import { getAccount, type Account } from '@/lib/services/people/get-account'
import { changePasswordAction, chooseUnitsAction, closeAccountAction, createTokenAction, editProfileAction, revokeTokenAction } from './actions'

export const metadata: Metadata = { title: 'Account' }

export default async function AccountPage() {
  const account = await getAccount(await memberContext())
  return (
    <>
      <PageTitle title="Account" lead={<>{account.email}{account.mark ? <> · you stamp as <b className="code">{account.mark}</b></> : null} · <Link href={paths.person(account.id)}>your sheet as others see it</Link></>}
        aside={<SignOutForm action={signOutAction} />} />
      <section className="grid gap-4" aria-labelledby="about-you">
        <RivetLine title="About you" id="about-you" />
        <FieldsForm action={editProfileAction} id="profile" button="Save" look="primary" fields={[
          { name: 'name', label: 'Name', autoComplete: 'name', maxLength: 80, value: account.name },
          { name: 'bio', label: 'What others should know', kind: 'area', maxLength: 1000, value: account.bio, optional: true, help: 'Your kit, how far you are, what you do for a living. It stands on your sheet.' },
        ]} />
      </section>
      <section className="grid gap-4" aria-labelledby="units">
        <RivetLine title="Measurements" id="units" />
        <UnitsForm action={chooseUnitsAction} units={account.units} />
      </section>
      <section className="grid gap-4" aria-labelledby="password">
        <RivetLine title="Password" id="password" />
        <FieldsForm action={changePasswordAction} id="change-password" button="Change the password" fields={[
          { name: 'currentPassword', label: 'Present password', kind: 'password', autoComplete: 'current-password', maxLength: 200 },
          { name: 'newPassword', label: 'New password', kind: 'password', autoComplete: 'new-password', maxLength: 200, help: 'At least 10 characters. A few words in a row do well.' },
        ]} />
      </section>
      <Tokens tokens={account.tokens} />
      <section className="grid gap-4" aria-labelledby="leaving">
        <RivetLine title="Leaving" id="leaving" />
        <p className="max-w-text">Closing your account takes away your name, your e-mail and your tokens, for good. What you wrote stays under “former member”, so that what you know goes on helping; stamps keep their number.</p>
        <Disclosure summary="Close my account">
          <FieldsForm action={closeAccountAction} id="close-account" button="Close my account for good" fields={[
            { name: 'currentPassword', label: 'Your password, to be sure it is you', kind: 'password', autoComplete: 'current-password', maxLength: 200 },
          ]} />
        </Disclosure>
      </section>
    </>
  )
}

function Tokens({ tokens }: Pick<Account, 'tokens'>) {
  return (
    <section className="grid gap-4" aria-labelledby="tokens">
      <RivetLine title="Personal tokens" id="tokens" note="for programs that read and write in your name" />
      {tokens.length === 0 ? <p className="text-ink-soft">You have none.</p> : (
        <ul className="sheet max-w-2xl divide-y divide-line">
          {tokens.map((t) => (
            <li key={t.id} className="flex flex-wrap items-center justify-between gap-3 px-5 py-3">
              <span><b>{t.name}</b> <span className="text-small text-ink-soft">made {formatDate(t.createdAt)}</span></span>
              <FieldsForm action={revokeTokenAction} id={`revoke-${t.id}`} hidden={{ tokenId: t.id }} fields={[]} button={`Revoke ${t.name}`} look="quiet" />
            </li>
          ))}
        </ul>
      )}
      <TokenForm action={createTokenAction} />
    </section>
  )
}
