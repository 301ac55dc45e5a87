// People, entries and answers with everything defaulted. What is published goes through the real services.
import { eq } from 'drizzle-orm'
import { member, mentorship, kit, section } from '@/db/schema'
import { write } from '@/db/transaction'
import { contextFor, type AppContext } from '@/lib/context'
import type { Member, Role } from '@/lib/policy/actor'
import { runtime } from '@/lib/runtime'
import type { NewEntry } from '@/lib/schemas/entry-input'
import type { Answer, Entry } from '@/lib/schemas/post'
import { listRequiredAnswerCautions, listRequiredCautions } from '@/lib/services/cautions/required-cautions'
import { createAnswer } from '@/lib/services/entries/create-answer'
import { createEntry } from '@/lib/services/entries/create-entry'
import { getEntry } from '@/lib/services/entries/get-entry'
import { createToken } from '@/lib/services/people/create-token'

let made = 0

/** Somebody with an account and a bearer token. */
export interface Somebody extends Member { email: string; token: string; context(): Promise<AppContext> }

export async function aMember({ role = 'member' as Role, name }: { role?: Role; name?: string } = {}): Promise<Somebody> {
  const number = ++made
  const { database } = await runtime()
  const email = `builder-${number}@pilothole.example`
  const person = { name: name ?? `Builder ${number}`, role }
  const id = await write(database, { actorId: null, at: Date.now() }, async (tx, record) => {
    const [row] = await tx.insert(member).values({ email, ...person, createdAt: Date.now() }).returning({ id: member.id })
    record('member.test', `member:${row!.id}`)
    return row!.id
  })
  const token = await createToken({ database, now: Date.now() }, { memberId: id, name: 'test' })
  const actor = { id, ...person, mark: null }
  return { ...actor, email, token, context: () => contextFor(actor) }
}

/** Somebody whom a steward granted mentorship. */
export async function aMentor(person: { role?: Role; name?: string } = {}): Promise<Somebody & { mark: string }> {
  const [mentor, steward] = [await aMember(person), await aMember({ role: 'steward' })]
  const mark = `TM ${String(mentor.id).padStart(3, '0')}`
  const { database } = await runtime()
  await write(database, { actorId: steward.id, at: Date.now() }, async (tx, record) => {
    await tx.insert(mentorship).values({ memberId: mentor.id, number: mark, fields: 'sheet metal', reason: 'Built one.', grantedBy: steward.id, createdAt: Date.now() - 1000 })
    record('mentorship.test', `member:${mentor.id}`)
  })
  const actor = { id: mentor.id, name: mentor.name, role: mentor.role, mark }
  return { ...mentor, mark, context: () => contextFor(actor) }
}

/** A kit of its own with one section on no system. */
export async function aKit(): Promise<{ slug: string; section: string }> {
  const slug = `test-kit-${++made}`
  const { database } = await runtime()
  return write(database, { actorId: null, at: Date.now() }, async (tx, record) => {
    const [row] = await tx.insert(kit).values({ slug, name: `Test kit ${made}`, maker: 'Saltmarsh Aircraft' }).returning({ id: kit.id })
    await tx.insert(section).values({ kitId: row!.id, code: 'S-1', title: 'Only section', position: 0, jasc: null })
    record('kit.test', `kit:${row!.id}`)
    return { slug, section: 'S-1' }
  })
}

type EntryOverrides = Partial<Omit<NewEntry, 'parts'>> & { parts?: Record<string, string | number> | undefined }
/** What an entry on no critical system says, ready to be sent; a body of the API. */
export function entryInput(overrides: EntryOverrides = {}) {
  const number = ++made
  return {
    kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], tasks: [], hardware: [], title: `Where do the labels go, case ${number}`,
    ...(overrides.body === undefined ? { parts: overrides.kind === 'lesson' ? { happened: 'The labels fell off over the winter.' } : { doing: 'Putting labels on boxes.' } } : {}),
    acknowledgedCautions: [] as string[], ...overrides,
  }
}

/** A section on a critical system (wing ribs, JASC 5712): what is published there needs two stamps. */
export const critical = { sections: ['W-3'] }

/** Published by `author` (somebody new when not given), with every required caution acknowledged. */
export async function anEntry(overrides: EntryOverrides = {}, author?: Somebody): Promise<Entry & { by: Somebody }> {
  const by = author ?? (await aMember())
  const context = await by.context()
  const input = entryInput(overrides)
  const text = [input.body, ...Object.values(input.parts ?? {})].filter((t) => typeof t === 'string').join('\n\n')
  const { cautions } = await listRequiredCautions(context, { title: input.title, body: text, kit: input.kit, sections: input.sections, tasks: input.tasks, hardware: input.hardware })
  const complete = { operations: [], plans: [], orderAdvice: [], ...input, acknowledgedCautions: cautions.map((c) => c.code) } as unknown as NewEntry
  return { ...(await getEntry(context, await createEntry(context, complete))), by }
}

/** Under `question` (a new one when not given), with every required caution acknowledged. */
export async function anAnswer({ question, body = 'Put them on the lid and on the front.', by: author, makerReply }: {
  question?: Entry; body?: string; by?: Somebody; makerReply?: 'bulletin' | 'all-kits' | 'one-serial'
} = {}): Promise<Answer & { by: Somebody; questionId: number }> {
  const by = author ?? (await aMember())
  const context = await by.context()
  const under = question ?? (await anEntry())
  const { cautions } = await listRequiredAnswerCautions(context, under.id, body)
  const id = await createAnswer(context, under.id, { body, acknowledgedCautions: cautions.map((c) => c.code), ...(makerReply ? { makerReply } : {}) })
  const answer = (await getEntry(context, under.id)).answers.find((a) => a.id === id)
  return { ...answer!, by, questionId: under.id }
}

/** Takes an account out of service, as a moderator would. */
export async function suspend(person: Somebody): Promise<void> {
  const { database } = await runtime()
  await write(database, { actorId: null, at: Date.now() }, async (tx, record) => {
    await tx.update(member).set({ state: 'suspended' }).where(eq(member.id, person.id))
    record('member.test', `member:${person.id}`)
  })
}
