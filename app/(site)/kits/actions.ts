'use server'
// Form actions of the steward who keeps plan steps, lists and bulletins.
import { z } from 'zod'
import { refresh } from 'next/cache'
import type { AppContext } from '@/lib/context'
import type { FormState } from '@/lib/form-state'
import { carryOut, field } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { linesSchema, newBulletinSchema, sectionPlace, type LinesMode } from '@/lib/schemas/plans'
import { idText, slug } from '@/lib/schemas/text'
import { asLines } from '@/lib/services/plans/as-lines'
import { enterBulletin } from '@/lib/services/plans/enter-bulletin'
import { endClosingItem, keepClosingItems, closingColumns } from '@/lib/services/plans/keep-closing-items'
import { hardwareColumns, keepHardware } from '@/lib/services/plans/keep-hardware'
import { keepPlanSteps, planStepColumns } from '@/lib/services/plans/keep-plan-steps'
import type { KeptLines } from '@/lib/services/plans/kept-lines'
import { readPlaces } from '@/lib/services/plans/read-places'

type Keep = (context: AppContext, place: { kit: string; section: string }, input: { mode: LinesMode; lines: string }) => Promise<KeptLines>

/** Keeps pasted lines. Lines that were refused come back by themselves, each with its reason, to be mended and added. */
async function keepLines(form: FormData, keep: Keep): Promise<FormState> {
  let done: KeptLines | null = null
  const state = await carryOut({
    form, schema: z.object({ place: sectionPlace, input: linesSchema }),
    read: (f) => ({ place: { kit: field(f, 'kit'), section: field(f, 'section') }, input: { mode: field(f, 'mode'), lines: field(f, 'lines') } }),
    run: async (context, { place, input }) => {
      done = await keep(context, place, input)
      refresh()
      return null
    },
  })
  return done === null ? state : afterLines(done)
}

function afterLines({ kept, bad }: KeptLines): FormState {
  const count = `${kept} ${kept === 1 ? 'line' : 'lines'} kept.`
  if (bad.length === 0) return { message: '', errors: [], values: {}, done: kept === 0 ? 'Nothing to keep: no line says anything.' : count }
  return {
    message: `${count} ${bad.length} could not be read and stand below.`, ...(kept > 0 ? { done: count } : {}),
    errors: bad.map((b) => ({ path: 'lines', message: `Line ${b.line}: ${b.message}` })), values: { lines: bad.map((b) => b.raw).join('\n'), mode: 'add' },
  }
}

/** One typed row as a line, so that both doors lead to the same reading; its errors belong to fields, not to lines. */
async function keepTyped(form: FormData, columns: readonly string[], keep: Keep): Promise<FormState> {
  const typed = new FormData()
  for (const name of ['kit', 'section']) typed.set(name, field(form, name))
  typed.set('mode', 'add')
  typed.set('lines', asLines(columns, [Object.fromEntries(columns.map((c) => [c, field(form, c)]))]))
  const state = await keepLines(typed, keep)
  if (state.message === '') return state
  const values = Object.fromEntries(columns.map((c) => [c, field(form, c)]))
  const errors = state.errors.map((e) => {
    const message = e.message.replace(/^Line \d+: /, '')
    const column = columns.find((c) => message.startsWith(`${c}: `))
    return column ? { path: column, message: message.slice(column.length + 2) } : { path: 'lines', message }
  })
  return { ...state, message: errors[0]?.message ?? state.message, errors, values }
}

export async function planStepsAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepLines(form, keepPlanSteps)
}
export async function planStepAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepTyped(form, planStepColumns, keepPlanSteps)
}
export async function hardwareLinesAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepLines(form, keepHardware)
}
export async function hardwareRowAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepTyped(form, hardwareColumns, keepHardware)
}
export async function closingLinesAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepLines(form, keepClosingItems)
}
export async function closingRowAction(_before: FormState, form: FormData): Promise<FormState> {
  return keepTyped(form, closingColumns, keepClosingItems)
}

export async function endClosingItemAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ place: sectionPlace, itemId: idText }), read: (f) => ({ place: { kit: field(f, 'kit'), section: field(f, 'section') }, itemId: field(f, 'itemId') }),
    run: async (context, { place, itemId }) => {
      await endClosingItem(context, itemId)
      return paths.sectionLists(place.kit, place.section)
    },
  })
}

export async function bulletinAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'bulletin', schema: z.object({ kit: slug, input: newBulletinSchema }),
    read: (f) => ({ kit: field(f, 'kit'), input: { number: field(f, 'number'), issuedOn: field(f, 'issuedOn'), serials: field(f, 'serials'), summary: field(f, 'summary'), steps: readPlaces(field(f, 'steps')) } }),
    run: async (context, { kit, input }) => {
      await enterBulletin(context, kit, input)
      return paths.bulletins(kit, input.number)
    },
  })
}
