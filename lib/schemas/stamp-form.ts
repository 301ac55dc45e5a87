// The stamp form: each basis has fields of its own, which become the stamp's reference. The API sends the reference itself (acts.ts).
import { z } from 'zod'
import { formatFullDate } from '@/lib/format/date'
import { newStampSchema, type NewStamp } from './acts'
import { idText } from './text'

const fields = z.object({
  postId: idText, revision: z.string(), basis: z.string(), page: z.string(), step: z.string(), plansRevision: z.string(), beforeMe: z.boolean(),
  edition: z.string(), paragraph: z.string(), build: z.string(), builtWhen: z.string(), replyDate: z.string(), scope: z.string(),
  /** Only where a number conflicts with a shop table. */
  conflictReason: z.string().default(''),
})
type Fields = z.infer<typeof fields>
type Fault = (path: string, message: string) => void

/** The name of the field that each path of a stamp is typed in, so that an error stands beside it. */
const fieldOfReference: Record<NewStamp['basis'], string> = { plans: 'page', standard: 'edition', 'own-build': 'build', 'maker-reply': 'replyDate' }

/** Reference and what else the chosen basis needs; faults name the field that is missing. */
function referenceOf(f: Fields, fault: Fault): Partial<NewStamp> | null {
  const need = (name: keyof Fields & string, message: string) => {
    const value = String(f[name]).trim()
    if (value === '') fault(name, message)
    return value
  }
  switch (f.basis) {
    case 'plans':
      if (!f.beforeMe) fault('beforeMe', 'A plans step is a basis only with its page before you.')
      return { basis: 'plans', reference: `${need('page', 'Which page?')} step ${need('step', 'Which step?')}`, plansRevision: need('plansRevision', 'Which revision of the page is before you?') }
    case 'standard':
      return { basis: 'standard', reference: `${need('edition', 'Which standard, in which edition?')} para ${need('paragraph', 'Which paragraph?')}` }
    case 'own-build':
      return { basis: 'own-build', reference: `${need('build', 'On which build?')}, ${need('builtWhen', 'When was that?')}` }
    case 'maker-reply':
      return { basis: 'maker-reply', reference: `reply of ${replyDate(need('replyDate', 'Of which day is the reply?'), fault)}`, scope: scopeOf(need('scope', 'For whom does the reply hold?'), fault) }
    default:
      fault('basis', 'What makes you sure? Choose a basis.')
      return null
  }
}

function replyDate(value: string, fault: Fault): string {
  const isDate = /^\d{4}-\d{2}-\d{2}$/.test(value) && !Number.isNaN(Date.parse(value))
  if (value !== '' && !isDate) fault('replyDate', 'Write the day as year-month-day, such as 2026-03-02.')
  return isDate ? formatFullDate(Date.parse(value)) : ''
}

function scopeOf(value: string, fault: Fault): NewStamp['scope'] {
  if (value === 'bulletin' || value === 'all-kits') return value
  if (value !== '') fault('scope', 'A reply for one serial cannot be stamped: each builder asks for their own.')
  return undefined
}

/** What was filled in, as the stamp to press and the post it goes on. Fields of other bases are left aside. */
export const stampFormSchema = fields.transform((f, context) => {
  let isFaulty = false
  const fault: Fault = (path, message) => {
    isFaulty = true
    context.addIssue({ code: 'custom', path: [path], message })
  }
  const reference = referenceOf(f, fault)
  if (isFaulty || !reference) return z.NEVER
  const stamp = newStampSchema.safeParse({ revision: f.revision, ...reference, ...(f.conflictReason.trim() ? { conflictReason: f.conflictReason } : {}) })
  if (stamp.success) return { postId: f.postId, stamp: stamp.data }
  for (const issue of stamp.error.issues) {
    const path = String(issue.path[0] ?? '')
    fault(path === 'reference' && reference.basis ? fieldOfReference[reference.basis] : path, issue.message)
  }
  return z.NEVER
})
