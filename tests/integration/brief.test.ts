// The brief of a section over real rows: whose voices count, what is shown where, and what never is.
import { eq } from 'drizzle-orm'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { build, closingItem, debrief, kit, planStep, section, task } from '@/db/schema'
import { write } from '@/db/transaction'
import type { Transaction } from '@/db/client'
import { contextFor } from '@/lib/context'
import type { Brief } from '@/lib/schemas/brief'
import { setPostState } from '@/lib/services/moderation/set-post-state'
import { pressStamp } from '@/lib/services/stamps/press-stamp'
import { getBrief } from '@/lib/services/briefs/get-brief'
import { api } from '../support/api'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, critical, type Somebody } from '../support/factories'

let runtime: TestRuntime
beforeEach(async () => { runtime = await openTestRuntime() })
afterEach(() => runtime.close())

const change = (run: (tx: Transaction) => Promise<unknown>) => write(runtime.database, { actorId: null, at: Date.now() }, async (tx, record) => {
  await run(tx)
  record('test.change', 'section:1')
})
const brief = async (code = 'W-3', kitSlug = 'whimbrel-2'): Promise<Brief> => getBrief(await contextFor(null), kitSlug, code)
const sectionId = async (tx: Transaction, code: string) => (await tx.select().from(section).where(eq(section.code, code)))[0]?.id ?? 0

/** Plan steps of W-3: mark, deburr edges, deburr holes, rivet. */
const withPlanSteps = () => change(async (tx) => {
  const tasks = new Map((await tx.select().from(task)).map((t) => [t.slug, t.id]))
  const id = await sectionId(tx, 'W-3')
  await tx.insert(planStep).values(['mark-part', 'deburr-edges', 'deburr-holes', 'rivet'].map((slug, i) => ({ sectionId: id, position: i, page: 'W3-2', step: String(i + 1), revision: 'C', taskId: tasks.get(slug) ?? null })))
})

const tell = (before: string, after: string, more: { by?: Somebody; sections?: string[]; kit?: string; hours?: number; tools?: string; differently?: string } = {}) => anEntry({
  kind: 'lesson', sections: more.sections ?? critical.sections, kit: more.kit ?? 'whimbrel-2', tasks: [before, after], title: `First ${before}, then ${after}, says somebody`,
  parts: { happened: 'I did it.', ...(more.differently ? { differently: more.differently } : {}), ...(more.tools ? { tools: more.tools } : {}), ...(more.hours === undefined ? {} : { hours: more.hours }) },
  orderAdvice: [{ before, after }],
}, more.by)

describe('the order of a brief', () => {
  it('is the plans’ own where builders say nothing', async () => {
    await withPlanSteps()
    const { order, tasks } = await brief()
    expect(order).toMatchObject({ tasks: ['mark-part', 'deburr-edges', 'deburr-holes', 'rivet'], hasBaseLine: true, builders: 0, departures: [], disagreements: [] })
    expect(tasks[1]).toMatchObject({ title: 'deburr edges', isInPlans: true, steps: [{ page: 'W3-2', step: '2', revision: 'C' }] })
  })

  it('departs from the plans where builders do, with one voice a builder and the posts behind it', async () => {
    await withPlanSteps()
    const twice = await aMember()
    const posts = [await tell('deburr-holes', 'deburr-edges', { by: twice }), await tell('deburr-holes', 'deburr-edges', { by: twice }), await tell('deburr-holes', 'deburr-edges')]
    const { order } = await brief()
    expect(order.tasks).toEqual(['mark-part', 'deburr-holes', 'deburr-edges', 'rivet'])
    expect(order.departures).toMatchObject([{ before: { slug: 'deburr-holes' }, after: { slug: 'deburr-edges' }, builders: 2 }])
    // Of a builder who says it twice the newest post stands behind it.
    expect(order.departures[0]?.posts.map((p) => p.postId)).toEqual([posts[1]?.id, posts[2]?.id])
  })

  it('names both sides of a disagreement with their posts, each with its cautions', async () => {
    const [one, other, third] = [await tell('mark-sides', 'rivet'), await tell('rivet', 'mark-sides'), await tell('mark-sides', 'rivet')]
    const [disagreement] = (await brief()).order.disagreements
    expect(disagreement).toMatchObject({ kind: 'both-ways', followed: { before: 'mark-sides', after: 'rivet' } })
    const sides = disagreement?.sides ?? []
    expect(sides.map((s) => [s.before.slug, s.builders, s.posts.map((p) => p.postId)])).toEqual([['mark-sides', 2, [one.id, third.id]], ['rivet', 1, [other.id]]])
    for (const post of sides.flatMap((s) => s.posts)) expect(post.cautions.map((c) => [c.signalWord, c.topic])).toContainEqual(['WARNING', 'structure'])
  })

  it('hears nothing of a post that is hidden', async () => {
    const post = await tell('mark-sides', 'rivet')
    expect((await brief()).order.builders).toBe(1)
    await setPostState(await (await aMember({ role: 'moderator' })).context(), post.id, { state: 'hidden', reason: 'It names a person.' })
    expect(await brief()).toMatchObject({ order: { builders: 0, tasks: [] }, tasks: [], unplaced: [], cautions: [] })
  })

  it('hears a debrief as the order that its builder went, unless it was taken back', async () => {
    const by = await aMember()
    await change(async (tx) => {
      const [place] = await tx.select().from(section).where(eq(section.code, 'W-3'))
      const [own] = await tx.insert(build).values({ memberId: by.id, kitId: place?.kitId ?? 0, name: 'Mine', createdAt: Date.now() }).returning()
      const row = { buildId: own?.id ?? 0, sectionId: place?.id ?? 0, createdAt: Date.now() }
      await tx.insert(debrief).values([
        { ...row, key: 'one', taskOrder: ['deburr-holes', 'mark-part', 'rivet'], minutes: 600 },
        { ...row, key: 'two', taskOrder: ['rivet', 'deburr-edges'], undoneAt: Date.now() },
      ])
    })
    const { order } = await brief()
    expect([order.tasks, order.builders, order.straightOn]).toEqual([['deburr-holes', 'mark-part', 'rivet'], 1, [{ before: 'deburr-holes', after: 'mark-part', builders: 1 }, { before: 'mark-part', after: 'rivet', builders: 1 }]])
  })
})

describe('across kits', () => {
  beforeEach(() => change(async (tx) => {
    const [ouzel] = await tx.select().from(kit).where(eq(kit.slug, 'ouzel-3'))
    await tx.insert(section).values([{ kitId: ouzel?.id ?? 0, code: '31', title: 'Ribs', position: 7, jasc: '5712' }, { kitId: ouzel?.id ?? 0, code: '32', title: 'Tanks', position: 8, jasc: '2810' }])
  }))

  it('sections on the same system speak where a section has fewer than three voices, and the brief says so', async () => {
    await tell('mark-part', 'rivet')
    await tell('deburr-edges', 'rivet', { kit: 'ouzel-3', sections: ['31'] })
    await tell('deburr-holes', 'rivet', { kit: 'ouzel-3', sections: ['32'] })
    const { order } = await brief()
    expect(order).toMatchObject({ ownBuilders: 1, builders: 2, otherKits: [{ kit: 'Ouzel 3', section: '31', title: 'Ribs', builders: 1 }] })
    expect(order.tasks).toEqual(['deburr-edges', 'mark-part', 'rivet'])
  })

  it('nobody else speaks where three builders of the section have', async () => {
    for (let i = 0; i < 3; i += 1) await tell('mark-part', 'rivet')
    await tell('rivet', 'mark-part', { kit: 'ouzel-3', sections: ['31'] })
    expect((await brief()).order).toMatchObject({ ownBuilders: 3, builders: 3, otherKits: [], disagreements: [] })
  })

  it('a section on no system asks nobody', async () => {
    await tell('mark-part', 'rivet', { kit: 'ouzel-3', sections: ['42'] })
    expect((await brief('X-1')).order).toMatchObject({ builders: 0, otherKits: [] })
  })
})

describe('what stands at a task', () => {
  it('is stamped know-how with how it was stamped, lessons that say the same together, and open questions', async () => {
    await withPlanSteps()
    const question = await anEntry({ ...critical, title: 'Which edge distance at the rib flange', tasks: ['rivet'] })
    const answer = await anAnswer({ question, body: 'Keep at least 2 D from the edge of the flange.' })
    const mentors = [await aMentor(), await aMentor()]
    for (const mentor of mentors) await pressStamp(await mentor.context(), answer.id, { revision: 'A', basis: 'plans', reference: 'W3-2 step 4', plansRevision: 'C' })
    const same = 'Label both faces of every rib before it leaves the box.'
    const lessons = [await tell('mark-part', 'rivet', { differently: same }), await tell('mark-part', 'rivet', { differently: same })]
    const open = await anEntry({ ...critical, title: 'Rib 12 nose touches the stiffener', tasks: [], plans: [{ page: 'W3-2', step: '2' }] })
    const { tasks } = await brief()
    const at = (slug: string) => tasks.find((t) => t.slug === slug)
    expect(at('rivet')?.knowHow).toMatchObject([{ postId: answer.id, title: question.title, passage: 'Keep at least 2 D from the edge of the flange.', stamp: 'stamped', missing: null }])
    expect(at('rivet')?.knowHow[0]?.stamps.map((s) => s.mentor.mark)).toEqual(mentors.map((m) => m.mark))
    expect(at('mark-part')?.lessons).toMatchObject([{ lead: { passage: same }, builders: 2 }])
    expect([at('mark-part')?.lessons[0]?.lead.postId, ...(at('mark-part')?.lessons[0]?.others.map((o) => o.postId) ?? [])].sort()).toEqual(lessons.map((l) => l.id).sort())
    // Placed by the step of the plans that it names.
    expect(at('deburr-edges')?.open.map((o) => o.postId)).toEqual([open.id])
  })

  // AC 43.13-1B and TM 10-5410-229-13&P, para 5-6: at least 2 D for a protruding head.
  it('is a size that a shop table agrees with, with table, source and the posts that use it; a wrong one is not', async () => {
    const right = await anEntry({ ...critical, kind: 'lesson', tasks: ['rivet'], hardware: ['rivet AN470AD4-4'], title: 'Where the rivets go', parts: { happened: 'Keep at least 2 D from every edge with the 1/8 rivets.' } })
    await anEntry({ ...critical, kind: 'lesson', tasks: ['rivet'], hardware: ['rivet AN470AD4-4'], title: 'A hole too large', parts: { happened: 'Drill #20 for the 1/8 rivets.' } })
    const sizes = (await brief()).unplaced.flatMap((t) => t.sizes)
    expect(sizes).toMatchObject([{ expected: 'at least 2 D', table: 'rivet', posts: [{ postId: right.id }] }])
    expect(sizes[0]?.source?.title).toMatch(/TM 10-5410/u)
    expect(sizes[0]?.cautions.map((c) => c.topic)).toContain('structure')
  })

  it('is never a post that is hidden, nor an answer under one', async () => {
    const question = await anEntry({ ...critical, tasks: ['rivet'], title: 'A question that names a person' })
    const answer = await anAnswer({ question, body: 'Ask the person named.' })
    const mentor = await (await aMentor()).context()
    await pressStamp(mentor, answer.id, { revision: 'A', basis: 'plans', reference: 'W3-2 step 4', plansRevision: 'C' })
    expect(JSON.stringify(await brief())).toContain('Ask the person named.')
    await setPostState(await (await aMember({ role: 'moderator' })).context(), question.id, { state: 'hidden', reason: 'It names a person.' })
    expect(JSON.stringify(await brief())).not.toMatch(/person named|names a person/u)
  })

  it('has every caution of its posts, and so has the brief', async () => {
    await anEntry({ ...critical, kind: 'lesson', tasks: ['rivet'], title: 'Loud work', parts: { happened: 'The rivet gun is loud in the wing.' } })
    const { unplaced: [rivet], cautions } = await brief()
    for (const topic of ['structure', 'hearing']) {
      expect(rivet?.cautions.map((c) => c.topic)).toContain(topic)
      expect(cautions.map((c) => c.topic)).toContain(topic)
    }
  })
})

it('hours are one value a builder from three on; tools and closing lines are listed', async () => {
  await tell('mark-part', 'rivet', { hours: 10, tools: 'Loupe, fluting pliers' })
  await tell('mark-part', 'rivet', { hours: 20, tools: 'Fluting pliers with soft jaws' })
  expect((await brief()).hours).toBeNull()
  await tell('mark-part', 'rivet', { hours: 30 })
  await change(async (tx) => {
    const row = { sectionId: await sectionId(tx, 'W-3'), origin: 'builder' as const, reference: 'W3-4', createdAt: Date.now() }
    await tx.insert(closingItem).values([{ ...row, position: 0, text: 'Chips out of the spar bay' }, { ...row, position: 1, text: 'No longer asked', endedAt: Date.now() }])
  })
  const { hours, tools, closing } = await brief()
  expect(hours).toEqual({ builders: 3, lower: 10, median: 20, upper: 30, least: 10, most: 30, points: [10, 20, 30] })
  expect(tools.map((t) => [t.name, t.builders])).toEqual([['Fluting pliers', 2], ['Loupe', 1]])
  expect(tools[0]?.cautions.map((c) => c.topic)).toContain('structure')
  expect(closing).toEqual([{ text: 'Chips out of the spar bay', origin: 'builder', reference: 'W3-4' }])
})

it('costs the same number of statements, however much was written', async () => {
  const count = async () => {
    const { reader, client } = runtime.database
    let statements = 0
    const execute = client.execute.bind(client)
    client.execute = ((...sent: Parameters<typeof client.execute>) => { statements += 1; return execute(...sent) }) as typeof client.execute
    try {
      await getBrief({ ...(await contextFor(null)), reader }, 'whimbrel-2', 'W-3')
    } finally {
      client.execute = execute
    }
    return statements
  }
  await tell('mark-part', 'rivet')
  const before = await count()
  expect(before).toBeGreaterThan(0)
  for (let i = 0; i < 12; i += 1) await anAnswer({ question: await anEntry({ ...critical, tasks: ['rivet'] }) })
  await tell('rivet', 'mark-part')
  expect(await count()).toBe(before)
})

describe('GET /api/kits/{kit}/sections/{section}/brief', () => {
  it('gives what the page shows, to a visitor', async () => {
    const post = await tell('mark-part', 'rivet', { differently: 'Mark before riveting.' })
    const { status, body } = await api<Brief>('GET', '/api/kits/whimbrel-2/sections/W-3/brief')
    expect(status).toBe(200)
    expect(body).toMatchObject({ kit: { slug: 'whimbrel-2' }, section: { code: 'W-3', jasc: '5712' }, url: '/kits/whimbrel-2/W-3/brief', order: { tasks: ['mark-part', 'rivet'] } })
    expect(body.plansWin).toMatch(/^The plans win\./u)
    expect(body.tasks[0]?.lessons[0]?.lead).toMatchObject({ postId: post.id, passage: 'Mark before riveting.' })
    expect(body.tasks[0]?.lessons[0]?.lead.cautions.map((c) => c.topic)).toContain('structure')
  })

  it.each(['/api/kits/whimbrel-2/sections/Z-9/brief', '/api/kits/heron-9/sections/W-3/brief'])('is 404 for %s', async (address) => {
    expect((await api('GET', address)).status).toBe(404)
  })
})
