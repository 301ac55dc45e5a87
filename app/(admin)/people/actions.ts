'use server'
// Form actions of stewards (and, for suspending builders, moderators) on a member.
import type { Route } from 'next'
import { z } from 'zod'
import type { AppContext } from '@/lib/context'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { can } from '@/lib/policy/can'
import { paths } from '@/lib/paths'
import { endMentorshipSchema, grantMentorshipSchema, setMemberStateSchema, setRoleSchema } from '@/lib/schemas/acts'
import { idText } from '@/lib/schemas/text'
import { endMentorship } from '@/lib/services/people/end-mentorship'
import { grantMentorship } from '@/lib/services/people/grant-mentorship'
import { setMemberState } from '@/lib/services/people/set-member-state'
import { setRole } from '@/lib/services/people/set-role'

const onMember = <T extends z.ZodType>(input: T) => z.object({ memberId: idText, input })

/** The steward goes on in the list; whoever may not open it goes on at the member's sheet. */
const backTo = (context: AppContext, memberId: number): Route => (can(context.actor, 'people.open') ? paths.people(memberId) : paths.person(memberId))

export async function setRoleAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: onMember(setRoleSchema), read: (f) => ({ memberId: field(f, 'memberId'), input: { role: field(f, 'role') } }),
    run: async (context, { memberId, input }) => {
      await setRole(context, memberId, input)
      return backTo(context, memberId)
    },
  })
}

export async function setMemberStateAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: onMember(setMemberStateSchema), read: (f) => ({ memberId: field(f, 'memberId'), input: { state: field(f, 'state'), reason: field(f, 'reason') } }),
    run: async (context, { memberId, input }) => {
      await setMemberState(context, memberId, input)
      return backTo(context, memberId)
    },
  })
}

export async function grantMentorshipAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: onMember(grantMentorshipSchema), read: (f) => ({ memberId: field(f, 'memberId'), input: { number: field(f, 'number'), fields: field(f, 'fields'), reason: field(f, 'reason') } }),
    run: async (context, { memberId, input }) => {
      await grantMentorship(context, memberId, input)
      return backTo(context, memberId)
    },
  })
}

export async function endMentorshipAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: onMember(endMentorshipSchema), read: (f) => ({ memberId: field(f, 'memberId'), input: { reason: field(f, 'reason') } }),
    run: async (context, { memberId, input }) => {
      await endMentorship(context, memberId, input)
      return backTo(context, memberId)
    },
  })
}
