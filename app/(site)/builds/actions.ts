'use server'
// Form actions of a member on their own build: make one, the state of a section, log, holds, closing list.
import { refresh } from 'next/cache'
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field, optionalField } from '@/lib/http/action'
import { paths } from '@/lib/paths'
import { changeLogLineSchema, closingAnswerSchema, newBuildSchema, newHoldSchema, newLogLineSchema, releaseHoldSchema, sectionStateSchema } from '@/lib/schemas/builds'
import { sitePath } from '@/lib/schemas/people'
import { idText, sectionCode } from '@/lib/schemas/text'
import { addHold } from '@/lib/services/builds/add-hold'
import { addLogLine, changeLogLine } from '@/lib/services/builds/add-log-line'
import { answerClosingItem } from '@/lib/services/builds/answer-closing-item'
import { makeBuild } from '@/lib/services/builds/make-build'
import { releaseHold } from '@/lib/services/builds/release-hold'
import { setSectionState } from '@/lib/services/builds/set-section-state'

const place = { buildId: idText, section: sectionCode }
const placeOf = (f: FormData) => ({ buildId: field(f, 'buildId'), section: field(f, 'section') })

export async function makeBuildAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'make-build', schema: newBuildSchema, read: (f) => ({ kit: field(f, 'kit'), name: field(f, 'name'), serial: field(f, 'serial') }),
    run: async (context, input) => paths.build(await makeBuild(context, input)),
  })
}

export async function setSectionStateAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ ...place, state: sectionStateSchema }), read: (f) => ({ ...placeOf(f), state: field(f, 'state') }), done: 'Set.',
    run: async (context, { buildId, section, state }) => {
      await setSectionState(context, buildId, section, state)
      refresh()
      return null
    },
  })
}

const logFields = (f: FormData) => ({
  day: field(f, 'day'), page: field(f, 'page'), steps: field(f, 'steps'), helpers: field(f, 'helpers'), line: field(f, 'line'),
  hours: optionalField(f, 'hours'), start: optionalField(f, 'start'), stop: optionalField(f, 'stop'),
})

export async function addLogLineAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ ...place, input: newLogLineSchema }), read: (f) => ({ ...placeOf(f), input: { key: field(f, 'key'), ...logFields(f) } }), done: 'In the log.',
    run: async (context, { buildId, section, input }) => {
      await addLogLine(context, buildId, section, input)
      refresh()
      return null
    },
  })
}

export async function changeLogLineAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ ...place, lineId: idText, input: changeLogLineSchema }), read: (f) => ({ ...placeOf(f), lineId: field(f, 'lineId'), input: logFields(f) }),
    run: async (context, { buildId, section, lineId, input }) => {
      await changeLogLine(context, buildId, lineId, input)
      return paths.buildSection(buildId, section, `line-${lineId}`)
    },
  })
}

export async function addHoldAction(_before: FormState, form: FormData): Promise<FormState> {
  const words = (f: FormData) => Object.fromEntries(['key', 'kind', 'what', 'page', 'step', 'until', 'notWaiting', 'untilSection'].map((name) => [name, field(f, name)]))
  return carryOut({
    form, schema: z.object({ ...place, input: newHoldSchema }), read: (f) => ({ ...placeOf(f), input: words(f) }),
    run: async (context, { buildId, section, input }) => paths.buildSection(buildId, section, `hold-${(await addHold(context, buildId, section, input)).id}`),
  })
}

export async function releaseHoldAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ buildId: idText, holdId: idText, input: releaseHoldSchema }), read: (f) => ({ buildId: field(f, 'buildId'), holdId: field(f, 'holdId'), input: { note: field(f, 'note') } }),
    run: async (context, { buildId, holdId, input }) => {
      const hold = await releaseHold(context, buildId, holdId, input.note)
      return sitePath(field(form, 'returnTo')) ?? paths.buildSection(buildId, hold.section.code, `hold-${holdId}`)
    },
  })
}

export async function answerClosingItemAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, schema: z.object({ buildId: idText, itemId: idText, input: closingAnswerSchema }),
    read: (f) => ({ buildId: field(f, 'buildId'), itemId: field(f, 'itemId'), input: { isDone: field(f, 'isDone') === 'yes', note: field(f, 'note') } }), done: 'Kept.',
    run: async (context, { buildId, itemId, input }) => {
      await answerClosingItem(context, buildId, itemId, input)
      refresh()
      return null
    },
  })
}
