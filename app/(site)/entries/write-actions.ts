'use server'
// Form actions that write text: a question, a lesson, a row, and their edits.
import { z } from 'zod'
import type { FormState } from '@/lib/form-state'
import { carryOut, field, fields, optionalField } from '@/lib/http/action'
import { readEntryForm } from '@/lib/http/read-entry-form'
import { paths } from '@/lib/paths'
import { answerEditSchema, entryEditSchema, newAnswerSchema, newEntrySchema } from '@/lib/schemas/entry-input'
import { idText } from '@/lib/schemas/text'
import { createAnswer } from '@/lib/services/entries/create-answer'
import { createEntry } from '@/lib/services/entries/create-entry'
import { editAnswer } from '@/lib/services/entries/edit-answer'
import { editEntry } from '@/lib/services/entries/edit-entry'

const publish = (kind: 'question' | 'lesson', form: FormData) => carryOut({
  form, once: kind, schema: newEntrySchema, read: (f) => readEntryForm(f, kind),
  run: async (context, input) => paths.entry(await createEntry(context, input)),
})

export async function questionAction(_before: FormState, form: FormData): Promise<FormState> {
  return publish('question', form)
}

export async function lessonAction(_before: FormState, form: FormData): Promise<FormState> {
  return publish('lesson', form)
}

const revise = (kind: 'question' | 'lesson', form: FormData) => carryOut({
  form, once: 'edit-entry', schema: z.object({ id: idText, input: entryEditSchema }),
  read: (f) => {
    const { kind: _kind, ...input } = readEntryForm(f, kind)
    return { id: field(f, 'entryId'), input: { ...input, revision: field(f, 'revision') } }
  },
  run: async (context, { id, input }) => {
    await editEntry(context, id, input)
    return paths.entry(id)
  },
})

export async function editQuestionAction(_before: FormState, form: FormData): Promise<FormState> {
  return revise('question', form)
}

export async function editLessonAction(_before: FormState, form: FormData): Promise<FormState> {
  return revise('lesson', form)
}

const readAnswer = (form: FormData) => ({ body: field(form, 'body'), makerReply: optionalField(form, 'makerReply'), acknowledgedCautions: fields(form, 'acknowledged') })

export async function answerAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'answer', schema: z.object({ questionId: idText, input: newAnswerSchema }), read: (f) => ({ questionId: field(f, 'questionId'), input: readAnswer(f) }),
    run: async (context, { questionId, input }) => paths.entry(questionId, await createAnswer(context, questionId, input)),
  })
}

export async function editAnswerAction(_before: FormState, form: FormData): Promise<FormState> {
  return carryOut({
    form, once: 'edit-answer', schema: z.object({ id: idText, input: answerEditSchema }), read: (f) => ({ id: field(f, 'answerId'), input: { ...readAnswer(f), revision: field(f, 'revision') } }),
    run: async (context, { id, input }) => paths.entry((await editAnswer(context, id, input)).questionId, id),
  })
}
