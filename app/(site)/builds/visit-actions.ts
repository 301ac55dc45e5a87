'use server'
// Form actions around a visit sheet: its owner makes and revokes the link; whoever has the link writes what they found.
import { refresh } from 'next/cache'
import { headers } from 'next/headers'
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { ownOrigin } from '@/lib/http/own-origin'
import { paths } from '@/lib/paths'
import { newFindingSchema, newVisitSchema } from '@/lib/schemas/builds'
import { idText, sectionCode } from '@/lib/schemas/text'
import { addFinding } from '@/lib/services/builds/add-finding'
import { makeVisit } from '@/lib/services/builds/make-visit'
import { revokeVisit } from '@/lib/services/builds/revoke-visit'

/** The link comes back in `values.address`: the only time it can be read. */
export async function makeVisitAction(_before: FormState, form: FormData): Promise<FormState> {
  let address = ''
  const state = await carryOut({
    form, schema: z.object({ buildId: idText, section: sectionCode, input: newVisitSchema }), done: 'Made.',
    read: (f) => ({ buildId: field(f, 'buildId'), section: field(f, 'section'), input: { visitor: field(f, 'visitor'), days: field(f, 'days') } }),
    run: async (context, { buildId, section, input }) => {
      address = `${ownOrigin(await headers())}${paths.visit(await makeVisit(context, buildId, section, input))}`
      refresh()
      return null
    },
  })
  return address === '' ? state : { ...state, values: { address } }
}

export async function revokeVisitAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ buildId: idText, visitId: idText }), read: (f) => ({ buildId: field(f, 'buildId'), visitId: field(f, 'visitId') }), done: 'Revoked. The link opens nothing any more.',
    run: async (context, { buildId, visitId }) => {
      await revokeVisit(context, buildId, visitId)
      refresh()
      return null
    },
  })
}

export async function addFindingAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ token: z.string(), input: newFindingSchema }), read: (f) => ({ token: field(f, 'token'), input: { key: field(f, 'key'), text: field(f, 'text') } }),
    done: 'Written. It is a hold of this build from now on.',
    run: async (context, { token, input }) => {
      await addFinding(context, token, input)
      refresh()
      return null
    },
  })
}
