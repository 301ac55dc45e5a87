// The walk: a caution goes wherever its post goes. Every page and route of the app stands in the table below with how it is looked
// at; one that the table does not know fails, so that whoever adds a page says how cautions travel there.
import { readdirSync } from 'node:fs'
import path from 'node:path'
import type { Page } from 'playwright-core'
import { beforeAll, describe, expect, test } from 'vitest'
import { openPage, visit } from '../support/browser'
import { call, idOf, must, type Who } from '../support/session'
import { acknowledgeAll, enterBulletin, publish, say, stampIt, unique, type Published } from './arrange'

interface Caution { code: string; signalWord: string; title: string; short: string; text: string; topic: string }
/** The words by which this test's texts are known wherever they turn up. `open` is an open question, `title` one with a stamped row. */
const word = { title: unique(), question: unique(), answer: unique(), remark: unique(), open: unique(), openText: unique(), lesson: unique(), lessonText: unique() }
type Word = keyof typeof word
const titles: readonly Word[] = ['title', 'open', 'lesson']

let question: Published
let open: Published
let lesson: Published
let answer: number
/** Of ife's, about a lesson whose title has the lesson's word: a bulletin changed its page. */
let notice: number
let cautions: Record<Word, Caution[]>
const author: Who = 'marit'

// Section F-4, seats and belts (JASC 2510): few other texts carry its caution, so that another post's plate does not pass for this one's.
const section = 'F-4'

beforeAll(async () => {
  question = await publish(author, { title: `Belt anchor ${word.title}`, section, text: `Fitting the lap belt anchor ${word.question}.` })
  answer = await say('bryn', question, `Stop. Replace the webbing and ask the kit maker ${word.answer}.`)
  await must('odile', 'POST', `/api/posts/${answer}/remarks`, { body: `The anchor bolt too ${word.remark}.` })
  open = await publish(author, { title: `Belt lug ${word.open}`, section, text: `The lug binds ${word.openText}.` })
  lesson = await publish(author, { kind: 'lesson', title: `Belt order ${word.lesson}`, section, text: `Anchors first ${word.lessonText}.` })
  await stampIt('jory', answer)
  await stampIt('tobias', answer)
  // Of other words than the lesson above: a brief shows one of several that say the same.
  const followed = await publish(author, { kind: 'lesson', title: `Inertia reel cover ${word.lesson}`, section, text: 'The cover of the reel goes on from below, with its slot towards the seat.', plans: [{ page: 'ZW-1', step: '1' }] })
  for (const follower of ['odile', 'ife'] as const) await must(follower, 'PUT', `/api/posts/${followed.id}/reliance`, {})
  await enterBulletin({ number: 'SB-walk', steps: 'ZW-1, 1, B' })
  notice = (await must('ife', 'GET', '/api/notices')).items.find((n: { post: { id: number } }) => n.post.id === followed.id).id
  const entry = await must(null, 'GET', `/api/entries/${question.id}`)
  const ofOpen = (await must(null, 'GET', `/api/entries/${open.id}`)).cautions
  const ofLesson = (await must(null, 'GET', `/api/entries/${lesson.id}`)).cautions
  cautions = { title: entry.cautions, question: entry.cautions, answer: entry.answers[0].cautions, remark: entry.answers[0].cautions, open: ofOpen, openText: ofOpen, lesson: ofLesson, lessonText: ofLesson }
  for (const list of Object.values(cautions)) expect(list.map((c) => c.signalWord)).toContain('WARNING')
})

type Check =
  /** A page: `shows` must be there; whatever of this test's texts is there has its cautions, in the same list item, row or sheet, or on the page's plate. */
  | { page: () => string; as?: Who; shows: readonly Word[]; within: 'block' | 'page' }
  /** An answer of the API or a feed, looked at object by object, entry by entry. */
  | { api: () => Promise<unknown>; shows: readonly Word[] }
  | { feed: () => string; shows: readonly Word[] }
  /** Shows no post: none of the texts is there. */
  | { without: (() => string) | null; as?: Who; why: string }

const get = (address: string, as: Who | null = null) => must(as, 'GET', address)
const codesOf = (list: Caution[]) => list.map((c) => c.code)

/** Asked in other words than those of the texts: the page says what it looked up. */
const explained = `/search/explain?kit=whimbrel-2&section=${section}&q=belt+anchor`

const table: Record<string, readonly Check[]> = {
  '(site)/page.tsx': [{ page: () => '/', shows: ['title', 'open'], within: 'block' }],
  '(site)/search/page.tsx': [
    { page: () => `/search?q=${word.title}`, shows: ['title'], within: 'block' },
    { page: () => `/search?q=${word.openText}`, shows: ['open', 'openText'], within: 'block' },
    { page: () => `/search?q=${word.answer}`, shows: ['title', 'answer'], within: 'block' },
    { page: () => `/search?kit=whimbrel-2&section=${section}`, shows: ['title', 'open', 'lesson'], within: 'block' },
  ],
  '(site)/entries/[id]/page.tsx': [
    { page: () => question.url, shows: ['title', 'question', 'answer', 'remark', 'open'], within: 'block' },
    { page: () => question.url, as: 'kofi', shows: ['title', 'question', 'answer', 'remark'], within: 'block' },
    { page: () => lesson.url, shows: ['lesson', 'lessonText'], within: 'block' },
  ],
  '(site)/entries/[id]/print/page.tsx': [
    { page: () => `${question.url}/print`, shows: ['title', 'question', 'answer'], within: 'page' },
    { page: () => `${lesson.url}/print`, shows: ['lesson', 'lessonText'], within: 'page' },
  ],
  '(site)/entries/[id]/edit/page.tsx': [{ page: () => `${question.url}/edit`, as: author, shows: ['title', 'question'], within: 'page' }],
  '(site)/answers/[id]/edit/page.tsx': [{ page: () => `/answers/${answer}/edit`, as: 'bryn', shows: ['title', 'question', 'answer'], within: 'page' }],
  '(site)/posts/[id]/revisions/page.tsx': [
    { page: () => `/posts/${question.id}/revisions`, shows: ['title', 'question'], within: 'page' },
    { page: () => `/posts/${answer}/revisions`, shows: ['answer'], within: 'page' },
  ],
  '(site)/kits/[kit]/[section]/page.tsx': [{ page: () => `/kits/whimbrel-2/${section}`, shows: ['title', 'open', 'lesson'], within: 'block' }],
  '(site)/kits/[kit]/[section]/brief/page.tsx': [{ page: () => `/kits/whimbrel-2/${section}/brief`, shows: ['open', 'lesson', 'lessonText', 'title', 'answer'], within: 'block' }],
  '(site)/kits/[kit]/[section]/brief/print/page.tsx': [{ page: () => `/kits/whimbrel-2/${section}/brief/print`, shows: ['title', 'answer'], within: 'page' }],
  '(site)/kits/[kit]/[section]/feed.atom/route.ts': [{ feed: () => `/kits/whimbrel-2/${section}/feed.atom`, shows: ['title', 'open', 'lesson'] }],
  '(site)/kits/[kit]/[section]/plans/page.tsx': [{ without: () => `/kits/whimbrel-2/${section}/plans`, why: 'pages, steps and tasks, no post' }],
  '(site)/kits/[kit]/[section]/lists/page.tsx': [{ without: () => `/kits/whimbrel-2/${section}/lists`, why: 'hardware and closing items, no post' }],
  '(site)/kits/[kit]/bulletins/page.tsx': [{ without: () => '/kits/whimbrel-2/bulletins', why: 'bulletins in one line each, no post' }],
  '(account)/waiting/page.tsx': [{ page: () => '/waiting', as: 'odile', shows: ['lesson'], within: 'block' }],
  '(site)/shop/page.tsx': [{ without: () => '/shop', why: 'tables only' }],
  '(site)/shop/[table]/page.tsx': [{ without: () => '/shop/grommet?bore=3/8', why: 'numbers and the cautions of the table, no post' }],
  '(site)/shop/drills/chart/page.tsx': [{ without: () => '/shop/drills/chart', why: 'a chart' }],
  'feed.atom/route.ts': [{ feed: () => '/feed.atom', shows: ['title', 'open', 'lesson'] }],
  '(site)/kits/page.tsx': [{ without: () => '/kits', why: 'kits and sections only' }],
  '(site)/kits/[kit]/page.tsx': [{ without: () => '/kits/whimbrel-2', why: 'leads to the kits' }],
  '(site)/kits/[kit]/limits/page.tsx': [{ without: () => '/kits/whimbrel-2/limits', as: 'wren', why: 'the maker’s values, no post' }],
  '(site)/ask/page.tsx': [{ without: () => '/ask', as: author, why: 'an empty form; what may already answer it has a test of its own below' }],
  '(site)/lesson/page.tsx': [{ without: () => '/lesson', as: author, why: 'an empty form' }],
  '(site)/guide/[slug]/page.tsx': [{ without: () => '/guide/how-stamps-work', why: 'prose of the house' }],
  '(site)/builds/page.tsx': [{ without: () => '/builds', as: author, why: 'names of one’s own aeroplanes' }],
  '(site)/builds/[id]/page.tsx': [{ page: () => `/builds/${buildId}`, as: 'dela', shows: ['title', 'lesson'], within: 'block' }],
  '(site)/builds/[id]/[section]/page.tsx': [{ page: () => `/builds/${buildId}/${section}`, as: 'dela', shows: ['title', 'lesson'], within: 'block' }],
  '(site)/builds/[id]/[section]/visit/page.tsx': [{ page: () => `/builds/${buildId}/${section}/visit`, as: 'dela', shows: ['title', 'lesson'], within: 'block' }],
  '(site)/builds/[id]/tags/page.tsx': [{ without: () => `/builds/${buildId}/tags`, as: 'dela', why: 'the builder’s own words and a code' }],
  '(site)/holds/[code]/page.tsx': [{ without: () => heldAt, as: 'dela', why: 'the builder’s own words' }],
  '(site)/visits/[token]/page.tsx': [{ page: () => visitAt, shows: ['title', 'lesson'], within: 'block' }],
  '(desk)/desk/page.tsx': [
    { page: () => `/desk?open=${answer}&section=whimbrel-2:${section}`, as: 'ansel', shows: ['open'], within: 'block' },
    { page: () => `/desk?open=${open.id}`, as: 'ansel', shows: ['open', 'openText'], within: 'block' },
    { page: () => `/desk?open=${lesson.id}`, as: 'ansel', shows: ['lesson', 'lessonText'], within: 'block' },
  ],
  '(admin)/search/explain/page.tsx': [{ page: () => explained, as: 'wren', shows: ['title'], within: 'block' }],
  '(desk)/desk/evidence/page.tsx': [{ without: () => '/desk/evidence', as: 'wren', why: 'counts and times only' }],
  '(admin)/people/[id]/page.tsx': [
    { page: () => `/people/${authorId}`, shows: ['title', 'open', 'lesson'], within: 'block' },
    { page: () => `/people/${answererId}`, shows: ['title'], within: 'block' },
  ],
  '(admin)/people/page.tsx': [{ without: () => '/people', as: 'wren', why: 'people only' }],
  '(account)/account/page.tsx': [{ without: () => '/account', as: author, why: 'one’s own account only' }],
  '(auth)/sign-in/page.tsx': [{ without: () => '/sign-in', why: 'a form' }],
  '(auth)/sign-up/page.tsx': [{ without: () => '/sign-up', why: 'a form' }],
  'layout.tsx': [{ without: null, why: 'the house around pages: it has no post' }],
  'error.tsx': [{ without: null, why: 'says that something broke' }],
  'global-error.tsx': [{ without: null, why: 'says that something broke' }],
  'not-found.tsx': [{ without: () => '/nothing/here', why: 'a sentence' }],
  'unauthorized.tsx': [{ without: () => '/account', why: 'a sentence' }],
  'forbidden.tsx': [{ without: () => '/people', as: author, why: 'a sentence' }],
  'robots.ts': [{ without: () => '/robots.txt', why: 'addresses only' }],
  'api/search/route.ts': [{ api: () => get(`/api/search?q=${word.title}`), shows: ['title'] }, { api: () => get(`/api/search?q=${word.answer}`), shows: ['answer'] }],
  'api/search/explain/route.ts': [{ api: () => must('wren', 'GET', `/api${explained}`), shows: ['title'] }],
  'api/suggest/route.ts': [{ api: () => get(`/api/suggest?q=${word.title.slice(0, -1)}`), shows: ['title'] }],
  'api/similar/route.ts': [{ api: () => must(null, 'POST', '/api/similar', { title: `Belt anchor ${word.title}`, kit: 'whimbrel-2' }), shows: ['title'] }],
  'api/entries/route.ts': [
    { api: () => get(`/api/entries?kit=whimbrel-2&section=${section}`), shows: ['title', 'question', 'answer', 'remark', 'open', 'openText', 'lesson', 'lessonText'] },
    { api: async () => { const again = await publishWith(word.openText); return must(null, 'GET', `/api/entries/${again}`) }, shows: ['openText'] },
  ],
  'api/entries/[id]/route.ts': [
    { api: () => get(`/api/entries/${question.id}`), shows: ['title', 'question', 'answer', 'remark'] },
    { api: () => must(author, 'PATCH', `/api/entries/${open.id}`, { revision: 'A', hardware: ['AN3-5A'], acknowledgedCautions: codesOf(cautions.open) }), shows: ['open', 'openText'] },
  ],
  'api/entries/[id]/answers/route.ts': [{ api: () => must('pell', 'POST', `/api/entries/${question.id}/answers`, { body: `Ask the maker ${word.answer}.`, acknowledgedCautions: codesOf(cautions.answer) }), shows: ['answer'] }],
  'api/answers/[id]/route.ts': [{ api: async () => must('bryn', 'PATCH', `/api/answers/${answer}`, { revision: 'A', body: `Stop at once ${word.answer}.`, acknowledgedCautions: codesOf(cautions.answer) }), shows: ['answer'] }],
  'api/posts/[id]/remarks/route.ts': [{ api: () => must('pell', 'POST', `/api/posts/${answer}/remarks`, { body: `Belt anchor again ${word.remark}.` }), shows: ['remark'] }],
  'api/posts/[id]/stamps/route.ts': [{ api: async () => must('hanne', 'POST', `/api/posts/${lesson.id}/stamps`, { revision: 'A', basis: 'plans', reference: 'F4-2 step 6', plansRevision: 'C' }), shows: [] }],
  'api/stamps/[id]/withdraw/route.ts': [{ api: async () => must('ansel', 'POST', `/api/stamps/${await stampIt('ansel', lesson.id)}/withdraw`, { reason: 'Read the wrong page.' }), shows: [] }],
  'api/posts/[id]/outcome/route.ts': [{ api: () => must('dela', 'PUT', `/api/posts/${lesson.id}/outcome`, { result: 'as-written', note: '' }), shows: [] }],
  'api/posts/[id]/reliance/route.ts': [{ api: () => must('dela', 'PUT', `/api/posts/${lesson.id}/reliance`, {}), shows: [] }],
  'api/builds/route.ts': [{ without: () => '/api/builds', as: 'dela', why: 'names and counts only' }],
  'api/builds/[id]/route.ts': [{ api: () => get(`/api/builds/${buildId}`, 'dela'), shows: ['title', 'lesson'] }],
  'api/builds/[id]/sections/[section]/route.ts': [
    { api: () => get(`/api/builds/${buildId}/sections/${section}`, 'dela'), shows: ['title', 'lesson'] },
    { api: () => must('dela', 'PATCH', `/api/builds/${buildId}/sections/${section}`, { state: 'waiting' }), shows: ['title', 'lesson'] },
  ],
  'api/builds/[id]/sections/[section]/log/route.ts': [{ api: () => must('dela', 'POST', `/api/builds/${buildId}/sections/${section}/log`, { key: 'walk-line', day: '2026-03-09', minutes: 30 }), shows: [] }],
  'api/builds/[id]/sections/[section]/holds/route.ts': [{ api: () => must('dela', 'POST', `/api/builds/${buildId}/sections/${section}/holds`, hold), shows: [] }],
  'api/builds/[id]/log/[line]/route.ts': [{ api: async () => {
    const { id } = await must('dela', 'POST', `/api/builds/${buildId}/sections/${section}/log`, { key: 'walk-line', day: '2026-03-09', minutes: 30 })
    return get(`/api/builds/${buildId}/log/${id}`, 'dela')
  }, shows: [] }],
  'api/builds/[id]/holds/[hold]/route.ts': [{ api: () => get(`/api/builds/${buildId}/holds/${holdId}`, 'dela'), shows: [] }],
  'api/builds/[id]/holds/[hold]/release/route.ts': [{ api: () => must('dela', 'POST', `/api/builds/${buildId}/holds/${holdId}/release`, { note: 'The kit maker wrote.' }), shows: [] }],
  'api/builds/[id]/closing/[item]/route.ts': [{ api: async () => (await call('dela', 'PUT', `/api/builds/${buildId}/closing/999999`, { isDone: true })).body, shows: [] }],
  'api/cautions/required/route.ts': [{ api: () => must(null, 'POST', '/api/cautions/required', { body: word.openText, kit: 'whimbrel-2', sections: [section] }), shows: [] }],
  'api/preview/route.ts': [{ api: async () => { const { html } = await must(null, 'POST', '/api/preview', { body: 'Only what was sent.' }); return html }, shows: [] }],
  'api/notices/route.ts': [{ api: () => must('odile', 'GET', '/api/notices'), shows: ['lesson'] }],
  'api/notices/[id]/close/route.ts': [{ api: () => must('ife', 'POST', `/api/notices/${notice}/close`, {}), shows: ['lesson'] }],
  'api/kits/route.ts': [{ without: () => '/api/kits', why: 'kits only' }],
  'api/kits/[kit]/route.ts': [{ without: () => '/api/kits/whimbrel-2', why: 'sections only' }],
  'api/kits/[kit]/sections/[section]/brief/route.ts': [{ api: () => get(`/api/kits/whimbrel-2/sections/${section}/brief`), shows: ['lesson', 'lessonText'] }],
  'api/operations/route.ts': [{ without: () => '/api/operations', why: 'operations and tasks only' }],
  'api/kits/[kit]/limits/route.ts': [{ without: () => '/api/kits/whimbrel-2/limits', why: 'the maker’s values, no post' }],
  'api/kits/[kit]/limits/[id]/end/route.ts': [{ api: async () => {
    const made = await must('wren', 'POST', '/api/kits/whimbrel-2/limits', { table: 'tube', result: 'hand-bend', value: { words: 'none by hand' }, reference: { title: 'Bulletin SB-11', section: 'page 1', year: '2026' } })
    return must('wren', 'POST', `/api/kits/whimbrel-2/limits/${made.id}/end`, { reason: 'Replaced.' })
  }, shows: [] }],
  'api/shop/route.ts': [{ without: () => '/api/shop', why: 'tables only' }],
  'api/shop/[table]/route.ts': [{ without: () => '/api/shop/grommet?bore=3/8', why: 'numbers and the cautions of the table, no post' }],
  'api/measurements/route.ts': [{ api: async () => JSON.stringify(await must(null, 'POST', '/api/measurements', { text: '#30 in 0.032' })), shows: [] }],
  'api/numbers-check/route.ts': [{ api: async () => JSON.stringify(await must(null, 'POST', '/api/numbers-check', { text: 'Use #30 for a 1/8 rivet.' })), shows: [] }],
  'api/health/route.ts': [{ without: () => '/api/health', why: 'says whether it can serve' }],
  'api/openapi.json/route.ts': [{ without: () => '/api/openapi.json', why: 'describes the interface' }],
  // Answers with counts and line numbers, never with what stood in a line.
  'api/import/route.ts': [{ api: async () => (await call('wren', 'POST', '/api/import', `{"title":"${word.title}"}`, { headers: { 'content-type': 'application/x-ndjson' } })).body, shows: [] }],
  'api/auth/[...nextauth]/route.ts': [{ without: () => '/api/auth/session', why: 'names a member at most' }],
  'api/[[...path]]/route.ts': [{ without: () => '/api/nothing', why: 'nothing is there' }],
}

let authorId = 0
let answererId = 0
beforeAll(async () => { [authorId, answererId] = [await idOf(author), await idOf('bryn')] })

// A build whose owner goes by the row and the lesson, with a hold and a link to its visit sheet.
const hold = { key: 'walk-hold', kind: 'hold', what: 'Belt anchor: do not close the floor', until: 'the kit maker’s reply' }
let buildId = 0
let holdId = 0
let heldAt = ''
let visitAt = ''
beforeAll(async () => {
  for (const id of [answer, lesson.id]) await must('dela', 'PUT', `/api/posts/${id}/reliance`, {})
  buildId = (await must('dela', 'POST', '/api/builds', { kit: 'whimbrel-2', name: 'Walked over' })).id
  const made = await must('dela', 'POST', `/api/builds/${buildId}/sections/${section}/holds`, hold)
  ;[holdId, heldAt] = [made.id, made.url]
  const page = await openPage({ as: 'dela', javaScript: false })
  await page.goto(`/builds/${buildId}/${section}`)
  await page.evaluate(() => { for (const details of document.querySelectorAll('details')) details.open = true })
  await page.getByLabel('Whom is it for?').fill('An inspector')
  await page.getByRole('button', { name: 'Make a link' }).click()
  visitAt = new URL((await page.locator('a[href*="/visits/"]').getAttribute('href')) ?? '').pathname
})

/** One more open question that holds `text`; returns its id. Its creation is checked like every answer. */
async function publishWith(text: string): Promise<number> {
  const body = { kind: 'question', kit: 'whimbrel-2', sections: [section], title: 'Belt once more', parts: { doing: `Belt anchor ${text}.` }, acknowledgedCautions: codesOf(cautions.open) }
  const made = await must(author, 'POST', '/api/entries', body)
  requireInObjects(made)
  return made.id
}

const known = (text: string): Word[] => (Object.keys(word) as Word[]).filter((name) => text.includes(word[name]))
/** Title and text of a caution count as the caution; a bare title needs its signal word and one topic, a text needs all of them. */
const names = (text: string, c: Caution) => text.toUpperCase().includes(c.signalWord) && (text.includes(c.title) || text.includes(c.short) || text.includes(c.topic))
const isCovered = (text: string, name: Word) => (titles.includes(name) ? cautions[name].some((c) => c.signalWord === 'WARNING' && names(text, c)) : cautions[name].every((c) => names(text, c)))

/** In JSON: the nearest object with cautions around a text has all of them. Answers without one of the texts have nothing to show. */
function requireInObjects(value: unknown, around: readonly Caution[] | null = null): Set<Word> {
  const seen = new Set<Word>()
  // What was looked for, repeated; it shows no post.
  if (typeof value === 'string' && Object.values(word).includes(value)) return seen
  if (typeof value === 'string') {
    for (const name of known(value)) {
      seen.add(name)
      expect(around, `${name} without cautions: ${value.slice(0, 80)}`).not.toBeNull()
      expect(isCovered((around ?? []).map((c) => `${c.signalWord} ${c.title ?? ''} ${c.topic}`).join('\n'), name), `${name}: ${JSON.stringify(around)}`).toBe(true)
    }
    return seen
  }
  if (value === null || typeof value !== 'object') return seen
  const own = (value as { cautions?: Caution[] }).cautions
  for (const inner of Object.values(value)) for (const name of requireInObjects(inner, Array.isArray(own) ? [...own, ...(isRemark(value) ? (around ?? []) : [])] : around)) seen.add(name)
  return seen
}
/** A remark adds what its own words require to the cautions of the post that it stands in. */
const isRemark = (value: object) => 'text' in value && !('revision' in value) && !('title' in value)

/** For each of this test's words on the page: the sheet around it, or else the list item, row or section, as read. */
async function blocksWith(page: Page, within: 'block' | 'page'): Promise<{ name: Word; text: string }[]> {
  const found = await page.evaluate(({ words, level }) => {
    const walker = document.createTreeWalker(document.body, NodeFilter.SHOW_TEXT | NodeFilter.SHOW_ELEMENT)
    const out: { name: string; text: string }[] = []
    for (let node = walker.nextNode(); node; node = walker.nextNode()) {
      const element = node instanceof Element ? node : node.parentElement
      // The search line repeats what was looked for; it shows no post.
      if (!element || element.closest('script, style, noscript, header')) continue
      const text = node instanceof HTMLInputElement || node instanceof HTMLTextAreaElement ? node.value : node instanceof Text ? node.data : ''
      const inForm = element.closest('form') !== null
      const block = level === 'page' || inForm ? element.closest('main') : (element.closest('article') ?? element.closest('li, tr, section, main'))
      for (const [name, value] of Object.entries(words)) if (text.includes(value)) out.push({ name, text: block?.textContent ?? '' })
    }
    return out
  }, { words: word as Record<string, string>, level: within })
  return found as { name: Word; text: string }[]
}

async function look(check: Check): Promise<void> {
  if ('page' in check) {
    const page = await openPage({ javaScript: false, ...(check.as === undefined ? {} : { as: check.as }) })
    await page.goto(check.page())
    const blocks = await blocksWith(page, check.within)
    expect([...new Set(blocks.map((b) => b.name))]).toEqual(expect.arrayContaining([...check.shows]))
    for (const { name, text } of blocks) expect(isCovered(text, name), `${name} in: ${text.slice(0, 600)}`).toBe(true)
    // The results page names what was looked for, in quotes.
    const title = (await page.title()).replace(/“[^”]*”/g, '')
    for (const name of known(title)) expect(title, name).toMatch(/^(WARNING|CAUTION|NOTICE)\b/)
  } else if ('api' in check) {
    expect([...requireInObjects(await check.api())]).toEqual(expect.arrayContaining([...check.shows]))
  } else if ('feed' in check) {
    const { text, status } = await call(null, 'GET', check.feed())
    expect(status).toBe(200)
    const [head, ...entries] = text.split('<entry>')
    expect(known(head ?? '')).toEqual([])
    for (const entry of entries) for (const name of known(entry)) expect(isCovered(entry, name), `${name} in: ${entry.slice(0, 600)}`).toBe(true)
    expect(known(text)).toEqual(expect.arrayContaining([...check.shows]))
  } else if (check.without !== null) {
    expect(known((await call(check.as ?? null, 'GET', check.without())).text)).toEqual([])
  }
}

const appFolder = path.join(process.cwd(), 'app')
const special = /(^|\/)(page|route|robots|sitemap|manifest|layout|template|default|loading|error|global-error|not-found|forbidden|unauthorized|opengraph-image|twitter-image|icon)\.tsx?$/
const files = readdirSync(appFolder, { recursive: true, encoding: 'utf8' }).map((file) => file.split(path.sep).join('/')).filter((file) => special.test(file)).sort()

test('every page, route and template of the app is known to the walk', () => {
  expect(files).toEqual(Object.keys(table).sort())
})

describe.each(Object.keys(table).sort())('%s', (file) => {
  test.each(table[file]!.map((check, i) => [i + 1, check] as const))('look %i', async (_number, check) => look(check))
})

describe('what is loaded into a page later', () => {
  test('results while typing', async () => {
    const page = await openPage()
    await visit(page, '/kits')
    await page.getByLabel('Search', { exact: true }).fill(word.title)
    const option = page.getByRole('listbox', { name: 'Suggestions and results' }).getByRole('option').filter({ hasText: word.title })
    await option.waitFor()
    expect(isCovered((await option.textContent()) ?? '', 'title')).toBe(true)
  })

  test('posts that may already answer a question', async () => {
    const page = await openPage({ as: 'pell' })
    await visit(page, '/ask')
    await page.getByLabel('What is the question?').fill(`Belt anchor ${word.title}`)
    const item = page.locator('.aid li').filter({ hasText: word.title })
    await item.waitFor()
    expect(isCovered((await item.textContent()) ?? '', 'title')).toBe(true)
  })

  test('the present version in a conflict', async () => {
    const page = await openPage({ as: author })
    await visit(page, `${lesson.url}/edit`)
    const present = await must(null, 'GET', `/api/entries/${lesson.id}`)
    await must(author, 'PATCH', `/api/entries/${lesson.id}`, { revision: present.revision, hardware: ['AN3-6A'], acknowledgedCautions: codesOf(cautions.lesson) })
    await page.getByLabel('What happened').fill('Written meanwhile about the belt.')
    await acknowledgeAll(page)
    await page.getByRole('button', { name: 'Post the new revision' }).click()
    await page.getByRole('region', { name: /Present version/ }).getByText(word.lessonText).waitFor()
    for (const { name, text } of await blocksWith(page, 'page')) expect(isCovered(text, name), name).toBe(true)
  })
})
