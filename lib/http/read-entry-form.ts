// The writing form -> what newEntrySchema and entryEditSchema take. Only named fields are read.
import 'server-only'
import { lessonParts, questionParts } from '@/lib/domain/entries/entry-text'
import { field, fields } from './action'

/** Values of a repeating field with its blanks, so that columns stay side by side. */
const column = (form: FormData, name: string) => form.getAll(name).map((v) => (typeof v === 'string' ? v.trim() : ''))

/** A new entry as typed. `hours` that is no number is passed on, so that the schema refuses it in words. */
export function readEntryForm(form: FormData, kind: 'question' | 'lesson') {
  const [kit = '', section = ''] = field(form, 'place').split('/')
  const [alsoKit, also] = field(form, 'also').split('/')
  const [steps, revisions] = [column(form, 'planStep'), column(form, 'planRevision')]
  const after = column(form, 'after')
  const hours = field(form, 'hours').trim().replace(',', '.')
  const body = field(form, 'body').trim()
  const parts = Object.fromEntries((kind === 'question' ? questionParts : lessonParts).map(([name]) => [name, field(form, name)]))
  const hasParts = Object.values(parts).some((v) => v.trim() !== '')
  return {
    kind, kit, sections: [section, ...(also && alsoKit === kit && also !== section ? [also] : []), ...fields(form, 'more')].filter((s) => s !== ''),
    tasks: fields(form, 'task'), hardware: fields(form, 'hardware'), title: field(form, 'title'),
    plans: column(form, 'planPage').flatMap((page, i) => page ? [{ page, ...(steps[i] ? { step: steps[i] } : {}), ...(revisions[i] ? { revision: revisions[i] } : {}) }] : []),
    orderAdvice: column(form, 'before').flatMap((before, i) => before && after[i] ? [{ before, after: after[i] }] : []),
    ...(body && !hasParts ? { body } : { parts: { ...parts, ...(kind === 'lesson' && hours ? { hours: Number.isFinite(Number(hours)) ? Number(hours) : hours } : {}) } }),
    acknowledgedCautions: fields(form, 'acknowledged'),
  }
}
