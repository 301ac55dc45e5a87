'use server'
// Form actions of a member on their own account.
import type { FormState } from '@/lib/form-state'
import { refresh } from 'next/cache'
import { forgetUnits } from '@/lib/auth/reader-units'
import { endSession, startSession } from '@/lib/auth/session-cookie'
import { refuse } from '@/lib/errors'
import { carryOut, field } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { changePasswordSchema, closeAccountSchema, newTokenSchema, profileSchema, revokeTokenSchema, unitsSchema } from '@/lib/schemas/people'
import { changePassword } from '@/lib/services/people/change-password'
import { chooseUnits } from '@/lib/services/people/choose-units'
import { closeAccount } from '@/lib/services/people/close-account'
import { createToken } from '@/lib/services/people/create-token'
import { editProfile } from '@/lib/services/people/edit-profile'
import { revokeToken } from '@/lib/services/people/revoke-token'

export async function editProfileAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: profileSchema, read: (f) => ({ name: field(f, 'name'), bio: field(f, 'bio') }), done: 'Saved. It stands beside everything you wrote.',
    run: async (context, input) => {
      await editProfile(context, input)
      refresh()
      return null
    },
  })
}

export async function chooseUnitsAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: unitsSchema, read: (f) => ({ units: field(f, 'units') }), done: 'Saved. It holds wherever you sign in.',
    run: async (context, input) => {
      await chooseUnits(context, input)
      await forgetUnits()
      refresh()
      return null
    },
  })
}

export async function changePasswordAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: changePasswordSchema, read: (f) => ({ currentPassword: field(f, 'currentPassword'), newPassword: field(f, 'newPassword') }),
    done: 'Changed. Wherever else you were signed in, you are signed out.',
    run: async (context, input) => {
      await startSession(await changePassword(context, input))
      return null
    },
  })
}

/** The token comes back in `values.token`: the only time it can be read. */
export async function createTokenAction(_before: FormState, form: FormData): Promise<FormState> {
  let token = ''
  const state = await carryOut({
    form, schema: newTokenSchema, read: (f) => ({ name: field(f, 'name') }), done: 'Made.',
    run: async (context, { name }) => {
      if (!context.actor) throw refuse.signIn()
      token = await createToken(context, { memberId: context.actor.id, name })
      refresh()
      return null
    },
  })
  return token === '' ? state : { ...state, values: { token } }
}

export async function revokeTokenAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: revokeTokenSchema, read: (f) => ({ tokenId: field(f, 'tokenId') }), done: 'Revoked.',
    run: async (context, { tokenId }) => {
      await revokeToken(context, tokenId)
      refresh()
      return null
    },
  })
}

export async function closeAccountAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: closeAccountSchema, read: (f) => ({ currentPassword: field(f, 'currentPassword') }),
    run: async (context, input) => {
      await closeAccount(context, input)
      await endSession()
      return paths.home
    },
  })
}
