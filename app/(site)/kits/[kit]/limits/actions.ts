'use server'
// Form actions of stewards on the kit maker's limits.
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field, optionalField } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { endLimitSchema, newLimitSchema } from '@/lib/schemas/kit-limits'
import { idText, slug } from '@/lib/schemas/text'
import { endLimit } from '@/lib/services/kits/end-limit'
import { enterLimit } from '@/lib/services/kits/enter-limit'

/** Fields named `inputs.<name>`; what was left open is left out. */
function inputsOf(form: FormData): Record<string, string> {
  const given = [...form.keys()].filter((name) => name.startsWith('inputs.')).map((name) => [name.slice('inputs.'.length), field(form, name)] as const)
  return Object.fromEntries(given.filter(([, text]) => text.trim() !== ''))
}

export async function enterLimitAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ kit: slug, input: newLimitSchema }),
    read: (f) => ({
      kit: field(f, 'kit'),
      input: {
        table: field(f, 'table'), result: field(f, 'result'), inputs: inputsOf(f), unit: field(f, 'unit'), note: field(f, 'note'), lessSafe: optionalField(f, 'lessSafe'),
        value: { number: field(f, 'value.number'), min: field(f, 'value.min'), max: field(f, 'value.max'), words: field(f, 'value.words') },
        reference: { title: field(f, 'reference.title'), section: field(f, 'reference.section'), year: field(f, 'reference.year') },
      },
    }),
    run: async (context, { kit, input }) => {
      const { id } = await enterLimit(context, kit, input)
      return paths.kitLimits(kit, {}, `limit-${id}`)
    },
  })
}

export async function endLimitAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ kit: slug, limitId: idText, input: endLimitSchema }),
    read: (f) => ({ kit: field(f, 'kit'), limitId: field(f, 'limitId'), input: { reason: field(f, 'reason') } }),
    run: async (context, { kit, limitId, input }) => {
      await endLimit(context, kit, limitId, input)
      return paths.kitLimits(kit)
    },
  })
}
