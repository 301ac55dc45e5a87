'use server'
// Form actions of the session: sign in, sign up, sign out. They work without JavaScript.
import { headers } from 'next/headers'
import { z } from 'zod'
import { endSession, startSession } from '@/lib/auth/session-cookie'
import { env } from '@/lib/env'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { clientAddress } from '@/lib/http/client-address'
import { paths } from '@/lib/paths'
import { signInSchema, signUpSchema } from '@/lib/schemas/people'
import { authenticate } from '@/lib/services/people/authenticate'
import { signUp } from '@/lib/services/people/sign-up'

export async function signInAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: signInSchema, read: (f) => ({ email: field(f, 'email'), password: field(f, 'password'), from: field(f, 'from') }),
    run: async (context, { email, password, from }) => {
      await startSession(await authenticate(context, { email, password, address: clientAddress(await headers()) }))
      return from ?? paths.home
    },
  })
}

export async function signUpAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: signUpSchema, read: (f) => ({ name: field(f, 'name'), email: field(f, 'email'), password: field(f, 'password'), from: field(f, 'from') }),
    run: async (context, { from, ...input }) => {
      await startSession(await signUp(context, input, env().SIGN_UP))
      return from ?? paths.home
    },
  })
}

/** A plain form with one button: there is nothing to type and nothing to mend. */
export async function signOutAction(form: FormData): Promise<void> {
  await carryOut({
    form, schema: z.object({}), read: () => ({}),
    run: async () => {
      await endSession()
      return paths.home
    },
  })
}
