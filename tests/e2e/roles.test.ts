// Who sees which page, that a change of rights holds from the next request, and that nothing forged or sent from another site counts.
import { beforeAll, describe, expect, inject, test } from 'vitest'
import { openPage, visit } from '../support/browser'
import { startServer } from '../support/production-server'
import { call, idOf, must, newPerson, sessionCookie, sessionValue, sql, type Who } from '../support/session'
import { demoEntry, publish, say, unique, type Published } from './arrange'

const roles = ['visitor', 'member', 'mentor', 'moderator', 'steward', 'suspended'] as const
type Role = (typeof roles)[number]
const who: Record<Exclude<Role, 'visitor' | 'suspended'>, Who> = { member: 'dela', mentor: 'jory', moderator: 'kofi', steward: 'wren' }

let question: Published
let answer: number
let hidden: Published
let suspended: Who
let buildId: number
let heldAt: string
let people: Record<Role, Who | null>

beforeAll(async () => {
  question = await publish('dela')
  answer = await say('dela', question)
  hidden = await publish('dela')
  await sql("update post set state = 'hidden', state_reason = 'Spam.', state_by = ?, state_at = ? where id = ?", [await idOf('kofi'), Date.now(), hidden.id])
  suspended = await newPerson({ name: 'Suspended Sam' })
  await sql("update member set state = 'suspended' where email = ?", [suspended])
  buildId = (await must('dela', 'POST', '/api/builds', { kit: 'whimbrel-2', name: 'Private' })).id
  heldAt = (await must('dela', 'POST', `/api/builds/${buildId}/sections/W-3/holds`, { key: 'roles-hold', kind: 'hold', what: 'Rib 7', until: 'a reply' })).url
  people = { visitor: null, ...who, suspended }
})

// A suspended member is a visitor in everything; the expectations are in the order of `roles`.
const everybody = [200, 200, 200, 200, 200, 200]
const members = [401, 200, 200, 200, 200, 401]
const nobody = [404, 404, 404, 404, 404, 404]
const table: Record<string, () => readonly [string, readonly number[]]> = {
  'the first page': () => ['/', everybody],
  'search': () => ['/search?q=rivet', everybody],
  'shop tables': () => ['/shop', everybody],
  'a shop table': () => ['/shop/grommet?bore=3/8', everybody],
  'the drill chart': () => ['/shop/drills/chart', everybody],
  'an unknown shop table': () => ['/shop/nothing', nobody],
  'kits': () => ['/kits', everybody],
  'a kit': () => ['/kits/whimbrel-2', [307, 307, 307, 307, 307, 307]],
  'the maker’s limits': () => ['/kits/whimbrel-2/limits', everybody],
  'the limits of an unknown kit': () => ['/kits/albatross-9/limits', nobody],
  'a section': () => ['/kits/whimbrel-2/W-3', everybody],
  'a section’s brief': () => ['/kits/whimbrel-2/W-3/brief', everybody],
  'its two pages': () => ['/kits/whimbrel-2/W-3/brief/print', everybody],
  'the brief of an unknown section': () => ['/kits/whimbrel-2/Z-9/brief', nobody],
  'plan steps': () => ['/kits/whimbrel-2/W-3/plans', everybody],
  'lists of a section': () => ['/kits/whimbrel-2/W-3/lists', everybody],
  'bulletins of a kit': () => ['/kits/whimbrel-2/bulletins', everybody],
  'what waits': () => ['/waiting', members],
  'an entry': () => [question.url, everybody],
  'its print': () => [`${question.url}/print`, everybody],
  'its revisions': () => [`/posts/${question.id}/revisions`, everybody],
  'revisions of a row': () => [`/posts/${answer}/revisions`, everybody],
  'editing somebody’s entry': () => [`${question.url}/edit`, [401, 200, 403, 403, 403, 401]],
  'editing somebody’s row': () => [`/answers/${answer}/edit`, [401, 200, 403, 403, 403, 401]],
  'ask': () => ['/ask', members],
  'lesson': () => ['/lesson', members],
  'account': () => ['/account', members],
  'my build': () => ['/builds', members],
  'somebody’s build': () => [`/builds/${buildId}`, [404, 200, 404, 404, 404, 404]],
  'a section of it': () => [`/builds/${buildId}/W-3`, [404, 200, 404, 404, 404, 404]],
  'its tags': () => [`/builds/${buildId}/tags`, [404, 200, 404, 404, 404, 404]],
  'its visit sheet': () => [`/builds/${buildId}/W-3/visit`, [404, 200, 404, 404, 404, 404]],
  'its data': () => [`/api/builds/${buildId}`, [404, 200, 404, 404, 404, 404]],
  'a section’s data': () => [`/api/builds/${buildId}/sections/W-3`, [404, 200, 404, 404, 404, 404]],
  'the code of a hold': () => [heldAt, everybody],
  'a code on no tag': () => ['/holds/AAAAAAAAAAAAAAAAAAAAAA', nobody],
  'a link to no visit': () => ['/visits/AAAAAAAAAAAAAAAAAAAAAA', nobody],
  'an unknown build': () => ['/builds/999999', nobody],
  'an unknown section of a build': () => [`/builds/${buildId}/Z-9`, nobody],
  'desk': () => ['/desk', [401, 403, 200, 403, 403, 401]],
  'why this order': () => ['/search/explain?q=rivet', [401, 403, 403, 403, 200, 401]],
  'time to an answer': () => ['/desk/evidence', [401, 403, 200, 403, 200, 401]],
  'people': () => ['/people', [401, 403, 403, 403, 200, 401]],
  'a member’s sheet': () => ['/people/1', everybody],
  'sign-in': () => ['/sign-in', everybody],
  'sign-up': () => ['/sign-up', everybody],
  'a page of the guide': () => ['/guide/how-stamps-work', everybody],
  'the feed': () => ['/feed.atom', everybody],
  'a section’s feed': () => ['/kits/whimbrel-2/W-3/feed.atom', everybody],
  'a hidden entry': () => [hidden.url, [404, 200, 404, 200, 200, 404]],
  'the print of a hidden entry': () => [`${hidden.url}/print`, [404, 200, 404, 200, 200, 404]],
  'revisions of a hidden entry': () => [`/posts/${hidden.id}/revisions`, [404, 200, 404, 200, 200, 404]],
  'an unknown entry': () => ['/entries/999999', nobody],
  'an entry that is no number': () => ['/entries/abc', nobody],
  'an unknown kit': () => ['/kits/albatross-9', nobody],
  'plan steps of an unknown section': () => ['/kits/whimbrel-2/Z-9/plans', nobody],
  'lists of an unknown section': () => ['/kits/whimbrel-2/Z-9/lists', nobody],
  'bulletins of an unknown kit': () => ['/kits/albatross-9/bulletins', nobody],
  'an unknown section': () => ['/kits/whimbrel-2/Z-9', nobody],
  'an unknown page of the guide': () => ['/guide/nothing', nobody],
  'an unknown member': () => ['/people/999999', nobody],
  'an unknown address': () => ['/nothing/here', nobody],
}

describe.each(roles)('a %s', (role) => {
  test.each(Object.keys(table))('gets the right answer from %s', async (name) => {
    const [address, expected] = table[name]!()
    const answered = await call(people[role], 'GET', address)
    expect(answered.status).toBe(expected[roles.indexOf(role)])
  })
})

test('a change of role holds on the next request', async () => {
  const person = await newPerson({ name: 'Rowan Climb' })
  expect((await call(person, 'GET', '/people')).status).toBe(403)
  const page = await openPage({ as: 'wren' })
  await visit(page, `/people?open=${await idOf(person)}`)
  await page.getByLabel('Role', { exact: true }).selectOption('steward')
  await page.getByRole('button', { name: 'Set the role' }).click()
  await page.getByText('Steward', { exact: false }).first().waitFor()
  await expect.poll(async () => (await call(person, 'GET', '/people')).status).toBe(200)
  await page.getByLabel('Role', { exact: true }).selectOption('member')
  await page.getByRole('button', { name: 'Set the role' }).click()
  await expect.poll(async () => (await call(person, 'GET', '/people')).status).toBe(403)
})

test('a suspension holds on the next request, in the page and in the API', async () => {
  const person = await newPerson({ name: 'Robin Out' })
  const theirs = await openPage({ as: person, expects: [401] })
  await visit(theirs, '/account')
  const page = await openPage({ as: 'wren', width: 390 })
  await visit(page, `/people?open=${await idOf(person)}`)
  await page.getByRole('button', { name: 'Suspend', exact: true }).click()
  await page.getByRole('alert').getByText('Write the reason.').first().waitFor()
  await page.getByLabel('Why', { exact: true }).last().fill('Advertises.')
  await page.getByRole('button', { name: 'Suspend', exact: true }).click()
  await page.getByRole('button', { name: 'Let them back in' }).waitFor()
  await theirs.reload()
  await theirs.getByRole('heading', { name: 'Sign in first' }).waitFor()
  expect((await call(person, 'POST', `/api/posts/${answer}/remarks`, { body: 'Still here.' })).status).toBe(401)
})

test('mentorship that is granted opens the desk, and closes it when it ends', async () => {
  const person = await newPerson({ name: 'Ida Bench' })
  const page = await openPage({ as: 'wren' })
  await visit(page, `/people?open=${await idOf(person)}`)
  await page.getByLabel('Number on the stamp').fill('IB 777')
  await page.getByLabel('Fields').fill('Sheet metal')
  await page.getByLabel('Why', { exact: true }).first().fill('Has built one.')
  await page.getByRole('button', { name: 'Grant mentorship' }).click()
  await page.getByRole('button', { name: 'End IB 777' }).waitFor()
  expect((await call(person, 'GET', '/desk')).status).toBe(200)
  await page.getByLabel('Why it ends').fill('Moved on.')
  await page.getByRole('button', { name: 'End IB 777' }).click()
  await page.getByRole('button', { name: 'Grant mentorship' }).waitFor()
  expect((await call(person, 'GET', '/desk')).status).toBe(403)
})

test('the last steward cannot be demoted', async () => {
  const page = await openPage({ as: 'wren' })
  await visit(page, `/people?open=${await idOf('wren')}`)
  await page.getByLabel('Role', { exact: true }).selectOption('member')
  await page.getByRole('button', { name: 'Set the role' }).click()
  await page.getByRole('alert').getByText(/steward/i).first().waitFor()
  expect((await call('wren', 'GET', '/people')).status).toBe(200)
  // Nobody suspends themselves or grants themselves mentorship: there is no form for it.
  expect(await page.getByRole('button', { name: /^Suspend$|Grant mentorship/ }).count()).toBe(0)
})

test('fields that claim a role do nothing', async () => {
  const page = await openPage({ javaScript: false })
  await page.goto('/sign-up')
  const email = `forged.${unique()}@pilothole.example`
  await page.getByLabel('Name').fill('Forged Fran')
  await page.getByLabel('E-mail').fill(email)
  await page.getByLabel('Password').fill('four rivets in a row')
  await page.locator('main form').evaluate((form) => form.insertAdjacentHTML('beforeend', '<input type="hidden" name="role" value="steward"><input type="hidden" name="state" value="active"><input type="hidden" name="memberId" value="1"><input type="hidden" name="mark" value="FF 001">'))
  await page.getByRole('button', { name: 'Sign up' }).click()
  await page.waitForURL((url) => url.pathname === '/')
  expect(await sql('select role from member where email = ?', [email])).toEqual([{ role: 'member' }])
  expect(await sql('select 1 from mentorship m join member p on p.id = m.member_id where p.email = ?', [email])).toEqual([])
  const refused = await call('dela', 'POST', '/api/entries', { kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], title: 'Forged', parts: { doing: 'x' }, acknowledgedCautions: [], authorId: 1, role: 'steward' })
  expect(refused.status).toBe(422)
})

test('a member who sends the steward’s form is refused', async () => {
  const person = await newPerson({ name: 'Plain Pat' })
  const page = await openPage({ as: 'wren', javaScript: false })
  await page.goto(`/people?open=${await idOf(person)}`)
  const form = page.locator('form').filter({ has: page.getByRole('button', { name: 'Set the role' }) })
  const fields = await form.evaluate((element) => [...new FormData(element as HTMLFormElement)].map(([name, value]) => [name, String(value)] as const))
  const body = new FormData()
  for (const [name, value] of fields) body.append(name, name === 'role' ? 'steward' : value)
  const sent = await fetch(`${inject('server').baseUrl}/`, { method: 'POST', body, redirect: 'manual', headers: { cookie: `${sessionCookie}=${await sessionValue(person)}`, origin: inject('server').baseUrl, 'sec-fetch-site': 'same-origin' } })
  expect(sent.status).not.toBe(303)
  expect(await sql('select role from member where email = ?', [person])).toEqual([{ role: 'member' }])
})

describe('from another site', () => {
  const evil = { origin: 'https://elsewhere.example', 'sec-fetch-site': 'cross-site' }

  test('a write to the API that rides on the cookie is refused', async () => {
    const sent = await call('dela', 'POST', `/api/posts/${answer}/remarks`, { body: 'From elsewhere.' }, { headers: evil })
    expect(sent.status).toBe(403)
    expect(sent.headers.get('content-type')).toContain('application/problem+json')
    const bare = await fetch(`${inject('server').baseUrl}/api/posts/${answer}/remarks`, { method: 'POST', body: '{"body":"From nowhere."}', headers: { 'content-type': 'application/json', cookie: `${sessionCookie}=${await sessionValue('dela')}` } })
    expect(bare.status).toBe(403)
    expect(await sql("select 1 from remark where body like 'From %where.'")).toEqual([])
  })

  test.each([['with an origin', evil], ['without one', { 'sec-fetch-site': 'cross-site' }], ['with nothing to tell', {}]])('a form that is sent %s changes nothing', async (_how, headers) => {
    const page = await openPage({ as: 'odile', javaScript: false })
    await page.goto('/account')
    const form = page.locator('form').filter({ has: page.getByRole('button', { name: 'Save' }) })
    const fields = await form.evaluate((element) => [...new FormData(element as HTMLFormElement)].map(([name, value]) => [name, String(value)] as const))
    const body = new FormData()
    for (const [name, value] of fields) body.append(name, name === 'name' ? 'Taken Over' : value)
    const sent = await fetch(`${inject('server').baseUrl}/account`, { method: 'POST', body, redirect: 'manual', headers: { cookie: `${sessionCookie}=${await sessionValue('odile')}`, ...headers } as Record<string, string> })
    expect(await sql("select 1 from member where name = 'Taken Over'")).toEqual([])
    expect(sent.status).toBe(403)
  })
})

test('with public reading off a visitor reads nothing but the sign-in and health', async () => {
  const { entry } = await demoEntry('demo-rib-7-edge')
  const server = await startServer(inject('server').dataDir, { PUBLIC_READING: 'off' })
  try {
    const status = async (as: Who | null, address: string, method = 'GET', body?: unknown) => {
      const answered = await call(as, method, address, body, { baseUrl: server.baseUrl })
      // Not a word of it in the refusal either.
      if (answered.status === 401) expect(answered.text).not.toContain(entry.title)
      return answered.status
    }
    for (const address of ['/', '/search?q=rib', '/kits', '/kits/whimbrel-2', '/kits/whimbrel-2/W-3', '/kits/whimbrel-2/W-3/brief', '/api/kits/whimbrel-2/sections/W-3/brief', entry.url, `/entries/${entry.id}/print`, `/posts/${entry.id}/revisions`, '/people/1', '/ask', '/feed.atom', '/kits/whimbrel-2/W-3/feed.atom', '/api/search?q=rib', '/api/suggest?q=rib', '/api/entries', `/api/entries/${entry.id}`, '/api/kits', '/api/operations']) {
      expect([address, await status(null, address)]).toEqual([address, 401])
      expect([address, (await status('dela', address)) < 400]).toEqual([address, true])
    }
    expect(await status(null, '/api/similar', 'POST', { title: entry.title })).toBe(401)
    expect(await status(null, '/api/preview', 'POST', { body: 'x' })).toBe(401)
    expect(await status(null, '/api/health')).toBe(200)
    expect(await status(null, '/sign-in')).toBe(200)
    expect(await status(null, '/guide/how-stamps-work')).toBe(200)
  } finally {
    await server.stop()
  }
})

test('the API without a session: reading is open, writing is not', async () => {
  expect((await must(null, 'GET', '/api/search?q=rivet')).results.length).toBeGreaterThan(0)
  for (const [method, address] of [['POST', '/api/entries'], ['PATCH', `/api/entries/${question.id}`], ['POST', `/api/entries/${question.id}/answers`], ['PATCH', `/api/answers/${answer}`], ['POST', `/api/posts/${answer}/remarks`], ['POST', `/api/posts/${answer}/stamps`], ['PUT', `/api/posts/${answer}/outcome`], ['PUT', `/api/posts/${answer}/reliance`], ['DELETE', `/api/posts/${answer}/reliance`], ['POST', '/api/stamps/1/withdraw'], ['POST', '/api/import'], ['POST', '/api/builds'], ['PATCH', `/api/builds/${buildId}/sections/W-3`], ['POST', `/api/builds/${buildId}/sections/W-3/log`], ['POST', `/api/builds/${buildId}/sections/W-3/holds`], ['POST', `/api/builds/${buildId}/holds/1/release`]] as const) {
    expect([method, address, (await call(null, method, address, method === 'DELETE' ? undefined : {})).status]).toEqual([method, address, 401])
    expect([method, address, (await call(suspended, method, address, method === 'DELETE' ? undefined : {})).status]).toEqual([method, address, 401])
  }
})
