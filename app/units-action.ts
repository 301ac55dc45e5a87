'use server'
// The units switch of every page: keeps the choice on this device, and the page comes back in it.
import { keepUnits } from '@/lib/auth/reader-units'
import { carryOut, field } from '@/lib/http/action'
import { unitsSchema } from '@/lib/schemas/people'

/** A choice that does not exist changes nothing. */
export async function keepUnitsAction(form: FormData): Promise<void> {
  await carryOut({
    form, schema: unitsSchema, read: (f) => ({ units: field(f, 'units') }),
    run: async (_context, { units }) => {
      await keepUnits(units)
      return null
    },
  })
}
