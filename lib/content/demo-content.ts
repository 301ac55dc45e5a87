// The demo scenario under content/demo: invented people, kits and posts. Times are days before the seed day.
import 'server-only'
import builds from '@/content/demo/builds.json'
import entries1 from '@/content/demo/entries-1.json'
import entries2 from '@/content/demo/entries-2.json'
import entries3 from '@/content/demo/entries-3.json'
import kits from '@/content/demo/kits.json'
import limits from '@/content/demo/limits.json'
import members from '@/content/demo/members.json'
import planSteps from '@/content/demo/plan-steps.json'
import plans from '@/content/demo/plans.json'
import operations from '@/content/operations.json'
import type { Basis, ReplyScope } from '@/lib/domain/stamps/stamp-state'

export interface DemoStamp { by: string; day: number; revision: string; basis: Basis; reference: string; plansRevision?: string; scope?: ReplyScope; withdrawn?: { day: number; reason: string } }
export interface DemoOutcome { by: string; day: number; revision: string; result: 'as-written' | 'with-change' | 'did-not-work'; note: string }
interface DemoMarks {
  stamps?: DemoStamp[]
  outcomes?: DemoOutcome[]
  goingByThis?: { by: string; day: number; revision: string }[]
  remarks?: { by: string; day: number; body: string }[]
  addedCautions?: { code: string; by: string; because: string; day: number }[]
  waivedCautions?: { code: string; by: string; reason: string; day: number }[]
}
export interface DemoAnswer extends DemoMarks { ref: string; author: string; day: number; body: string; makerReply?: ReplyScope; revisions?: { day: number; body: string }[] }
export interface DemoText {
  title: string; sections: string[]; tasks: string[]; operations?: string[]; hardware: string[]
  plans?: { page: string; step?: string; revision?: string }[]; parts: Record<string, string | number>; orderAdvice?: { before: string; after: string }[]
}
export interface DemoEntry extends DemoMarks, DemoText {
  ref: string; kind: 'question' | 'lesson'; kit: string; author: string; day: number
  revisions?: { day: number; changes: Partial<DemoText> }[]
  answers?: DemoAnswer[]
}
export interface DemoMember { key: string; name: string; email: string; role: 'member' | 'moderator' | 'steward'; bio: string; mentor?: { number: string; fields: string; reason: string } }

export interface DemoBuild {
  member: string; kit: string; name: string; serial: string; day: number
  sections: { code: string; state: 'in-work' | 'waiting' | 'done'; day: number }[]
  log: { section: string; day: number; minutes: number; page: string; steps: string; helpers: string; line: string }[]
  holds: { section: string; kind: 'hold' | 'left-open'; what: string; page: string; step: string; until?: string; notWaiting?: string; untilSection?: string; day: number; released?: { day: number; note: string } }[]
}
export interface DemoLimit { kit: string; by: string; day: number; table: string; result: string; inputs: Record<string, string>; value: { number?: string; min?: string; max?: string; words?: string }; unit: string; reference: { title: string; section: string; year: string }; note: string }
/** Page, step and task of each plan step of a section, in order. */
export interface DemoPlanSteps { kit: string; section: string; revision: string; steps: [string, string, string][] }
type InSection<T> = { kit: string; section: string } & T
export interface DemoPlans {
  /** Page, step, revision, task. */
  steps: InSection<{ steps: [string, string, string, string][] }>[]
  /** Designation, length, left, right, where. */
  hardware: InSection<{ items: [string, string, number, number, string][] }>[]
  closing: InSection<{ items: [string, 'plans' | 'builder' | 'inspector', string][] }>[]
  bulletins: { kit: string; by: string; day: number; number: string; issuedOn: string; serials: string; summary: string; steps: { page: string; step?: string; revision?: string }[] }[]
}

/** The password of every demo member. The demo says so when it starts. */
export const demoPassword = 'whimbrel-demo'

export const demoContent = {
  kits, operations, members: members as DemoMember[], limits: limits as unknown as DemoLimit[], planSteps: planSteps as unknown as DemoPlanSteps[], plans: plans as unknown as DemoPlans, builds: builds as unknown as DemoBuild[],
  entries: [...(entries1 as unknown as DemoEntry[]), ...(entries2 as unknown as DemoEntry[]), ...(entries3 as unknown as DemoEntry[])],
}
