// Which units this request's reader wants first. The switch on a page keeps it in a cookie for this device, the account for every
// device: the cookie wins where it is, so that a shop's phone can differ, and saving the account takes this device's cookie away.
import 'server-only'
import { cache } from 'react'
import { cookies } from 'next/headers'
import { unitsChoiceOf, type UnitsChoice } from '@/lib/format/units-choice'
import { currentMember } from './current-user'

const cookieName = 'units'
const yearSeconds = 31_536_000

/** The cookie's choice, else the member's, else as written. */
export const readerUnits = cache(async (): Promise<UnitsChoice> =>
  unitsChoiceOf((await cookies()).get(cookieName)?.value) ?? unitsChoiceOf((await currentMember())?.member.units) ?? 'written')

/** Keeps the choice on this device. Actions only. */
export async function keepUnits(choice: UnitsChoice): Promise<void> {
  (await cookies()).set(cookieName, choice, { path: '/', maxAge: yearSeconds, sameSite: 'lax', httpOnly: true })
}

/** Lets the account decide on this device again. Actions only. */
export async function forgetUnits(): Promise<void> {
  (await cookies()).delete(cookieName)
}
