// Who may do what: the whole table, every role by every act, written out by hand from the product's roles.
// A letter in a column means yes, a dot no; an act that is missing here fails the test.
import { describe, expect, it } from 'vitest'
import type { Actor, Role } from '@/lib/policy/actor'
import { allActs, can, type Act, type PostSubject } from '@/lib/policy/can'
import { whyNot } from '@/lib/policy/why-not'

const writerIds = [3, 5]
const person = (id: number, role: Role, mark: string | null = null): Actor => ({ id, name: `member ${id}`, role, mark })

/** The columns of both tables, in this order. */
const actors: readonly (readonly [string, Actor])[] = [
  ['visitor', null],
  ['member', person(2, 'member')],
  ['author', person(3, 'member')],
  ['mentor', person(4, 'member', 'IC 042')],
  ['mentor who wrote it', person(5, 'member', 'HB 031')],
  ['moderator', person(6, 'moderator')],
  ['steward', person(7, 'steward')],
  ['steward and mentor', person(8, 'steward', 'WS 001')],
]

/** Columns: visitor V, member M, author A, mentor T, mentor who wrote it W, moderator O, steward S, steward and mentor X. */
const postTable = `
post.read                question visible    VMATWOSX
post.read                question hidden     ..A.WOSX
post.read                question merged     ..A.WOSX
post.read                question withdrawn  VMATWOSX
post.read                lesson   visible    VMATWOSX
post.read                lesson   hidden     ..A.WOSX
post.read                lesson   merged     ..A.WOSX
post.read                lesson   withdrawn  VMATWOSX
post.read                answer   visible    VMATWOSX
post.read                answer   hidden     ..A.WOSX
post.read                answer   merged     ..A.WOSX
post.read                answer   withdrawn  VMATWOSX

post.edit                question visible    ..A.W...
post.edit                question hidden     ........
post.edit                question merged     ........
post.edit                question withdrawn  ........
post.edit                lesson   visible    ..A.W...
post.edit                lesson   hidden     ........
post.edit                lesson   merged     ........
post.edit                lesson   withdrawn  ........
post.edit                answer   visible    ..A.W...
post.edit                answer   hidden     ........
post.edit                answer   merged     ........
post.edit                answer   withdrawn  ........

post.remark              question visible    .MATWOSX
post.remark              question hidden     ........
post.remark              question merged     ........
post.remark              question withdrawn  ........
post.remark              lesson   visible    .MATWOSX
post.remark              lesson   hidden     ........
post.remark              lesson   merged     ........
post.remark              lesson   withdrawn  ........
post.remark              answer   visible    .MATWOSX
post.remark              answer   hidden     ........
post.remark              answer   merged     ........
post.remark              answer   withdrawn  ........

post.stamp               question visible    ........
post.stamp               question hidden     ........
post.stamp               question merged     ........
post.stamp               question withdrawn  ........
post.stamp               lesson   visible    ...T...X
post.stamp               lesson   hidden     ........
post.stamp               lesson   merged     ........
post.stamp               lesson   withdrawn  ........
post.stamp               answer   visible    ...T...X
post.stamp               answer   hidden     ........
post.stamp               answer   merged     ........
post.stamp               answer   withdrawn  ........

post.ask-for             question visible    ...T...X
post.ask-for             question hidden     ........
post.ask-for             question merged     ........
post.ask-for             question withdrawn  ........
post.ask-for             lesson   visible    ...T...X
post.ask-for             lesson   hidden     ........
post.ask-for             lesson   merged     ........
post.ask-for             lesson   withdrawn  ........
post.ask-for             answer   visible    ...T...X
post.ask-for             answer   hidden     ........
post.ask-for             answer   merged     ........
post.ask-for             answer   withdrawn  ........

post.tell-how-it-went    question visible    ........
post.tell-how-it-went    question hidden     ........
post.tell-how-it-went    question merged     ........
post.tell-how-it-went    question withdrawn  ........
post.tell-how-it-went    lesson   visible    .M.T.OSX
post.tell-how-it-went    lesson   hidden     ........
post.tell-how-it-went    lesson   merged     ........
post.tell-how-it-went    lesson   withdrawn  ........
post.tell-how-it-went    answer   visible    .M.T.OSX
post.tell-how-it-went    answer   hidden     ........
post.tell-how-it-went    answer   merged     ........
post.tell-how-it-went    answer   withdrawn  ........

post.go-by               question visible    ........
post.go-by               question hidden     ........
post.go-by               question merged     ........
post.go-by               question withdrawn  ........
post.go-by               lesson   visible    .M.T.OSX
post.go-by               lesson   hidden     ........
post.go-by               lesson   merged     ........
post.go-by               lesson   withdrawn  ........
post.go-by               answer   visible    .M.T.OSX
post.go-by               answer   hidden     ........
post.go-by               answer   merged     ........
post.go-by               answer   withdrawn  ........

post.set-cautions        question visible    .....OSX
post.set-cautions        question hidden     .....OSX
post.set-cautions        question merged     .....OSX
post.set-cautions        question withdrawn  .....OSX
post.set-cautions        lesson   visible    .....OSX
post.set-cautions        lesson   hidden     .....OSX
post.set-cautions        lesson   merged     .....OSX
post.set-cautions        lesson   withdrawn  .....OSX
post.set-cautions        answer   visible    .....OSX
post.set-cautions        answer   hidden     .....OSX
post.set-cautions        answer   merged     .....OSX
post.set-cautions        answer   withdrawn  .....OSX

post.hide                question visible    .....OSX
post.hide                question hidden     .....OSX
post.hide                question merged     .....OSX
post.hide                question withdrawn  .....OSX
post.hide                lesson   visible    .....OSX
post.hide                lesson   hidden     .....OSX
post.hide                lesson   merged     .....OSX
post.hide                lesson   withdrawn  .....OSX
post.hide                answer   visible    .....OSX
post.hide                answer   hidden     .....OSX
post.hide                answer   merged     .....OSX
post.hide                answer   withdrawn  .....OSX
`

/** Where a visible answer passes on a kit maker's reply, by its scope. */
const makerReplyTable = `
post.stamp               bulletin            ...T...X
post.stamp               all-kits            ...T...X
post.stamp               one-serial          ........
post.go-by               bulletin            .M.T.OSX
post.go-by               all-kits            .M.T.OSX
post.go-by               one-serial          ........
post.tell-how-it-went    one-serial          .M.T.OSX
post.read                one-serial          VMATWOSX
`

type Ask = (actor: Actor) => boolean
/** Acts that are not about a post. Same columns. */
const otherTable: readonly (readonly [Act, string, string, Ask])[] = [
  ['read', 'public reading on', 'VMATWOSX', (a) => can(a, 'read', { publicReading: true })],
  ['read', 'public reading off', '.MATWOSX', (a) => can(a, 'read', { publicReading: false })],
  ['post.write', '', '.MATWOSX', (a) => can(a, 'post.write')],
  ['stamp.withdraw', 'pressed by the mentor of the table', '...T....', (a) => can(a, 'stamp.withdraw', { mentorId: 4 })],
  ['stamp.withdraw', 'pressed by somebody whose mentorship ended', '.M......', (a) => can(a, 'stamp.withdraw', { mentorId: 2 })],
  ['stamp.withdraw', 'imported', '........', (a) => can(a, 'stamp.withdraw', { mentorId: null })],
  ['desk.open', '', '...TW..X', (a) => can(a, 'desk.open')],
  ['search.explain', '', '......SX', (a) => can(a, 'search.explain')],
  ['evidence.open', '', '...TW.SX', (a) => can(a, 'evidence.open')],
  ['people.open', '', '......SX', (a) => can(a, 'people.open')],
  ['people.set-role', 'of somebody else', '......SX', (a) => can(a, 'people.set-role', { memberId: 99 })],
  ['people.set-role', 'of the steward of the table', '......SX', (a) => can(a, 'people.set-role', { memberId: 7 })],
  ['people.set-state', 'of a builder', '.....OSX', (a) => can(a, 'people.set-state', { memberId: 99, role: 'member' })],
  ['people.set-state', 'of another moderator', '......SX', (a) => can(a, 'people.set-state', { memberId: 99, role: 'moderator' })],
  ['people.set-state', 'of another steward', '......SX', (a) => can(a, 'people.set-state', { memberId: 99, role: 'steward' })],
  ['people.set-state', 'of the steward of the table', '.......X', (a) => can(a, 'people.set-state', { memberId: 7, role: 'steward' })],
  ['people.grant-mentorship', 'to somebody else', '......SX', (a) => can(a, 'people.grant-mentorship', { memberId: 99 })],
  ['people.grant-mentorship', 'to the steward of the table', '.......X', (a) => can(a, 'people.grant-mentorship', { memberId: 7 })],
  ['kit.set-limits', '', '......SX', (a) => can(a, 'kit.set-limits')],
  ['kits.keep', '', '......SX', (a) => can(a, 'kits.keep')],
  ['notice.close', 'of the mentor of the table', '...T....', (a) => can(a, 'notice.close', { memberId: 4 })],
  ['import', '', '......SX', (a) => can(a, 'import')],
  ['account.open', '', '.MATWOSX', (a) => can(a, 'account.open')],
  ['builds.keep', '', '.MATWOSX', (a) => can(a, 'builds.keep')],
  ['build.open', 'of the member of the table', '.M......', (a) => can(a, 'build.open', { ownerId: 2 })],
  ['build.open', 'of the moderator of the table', '.....O..', (a) => can(a, 'build.open', { ownerId: 6 })],
  ['build.open', 'of somebody else', '........', (a) => can(a, 'build.open', { ownerId: 99 })],
]

const postActs = ['post.read', 'post.edit', 'post.remark', 'post.stamp', 'post.ask-for', 'post.tell-how-it-went', 'post.go-by', 'post.set-cautions', 'post.hide'] as const
type PostAct = (typeof postActs)[number]
const kinds = ['question', 'lesson', 'answer'] as const
const states = ['visible', 'hidden', 'merged', 'withdrawn'] as const

const rowsOf = (table: string) => table.split('\n').filter((row) => row.trim() !== '').map((row) => row.trim().split(/\s+/))
const namesOf = (mask: string) => actors.filter((_, column) => mask[column] !== '.').map(([name]) => name)
const allowed = (ask: Ask) => actors.filter(([, actor]) => ask(actor)).map(([name]) => name)
const aPost = (over: Partial<PostSubject>): PostSubject => ({ kind: 'answer', state: 'visible', authorIds: writerIds, ...over })
/** Picks from a closed list, so that a slip in a table fails instead of passing as a new word. */
const oneOf = <T extends string>(list: readonly T[], word: string | undefined): T => {
  const found = list.find((item) => item === word)
  if (found === undefined) throw new Error(`The table says "${word}", which is none of ${list.join(', ')}`)
  return found
}

describe('who may do what to a post', () => {
  const rows = rowsOf(postTable).map(([act, kind, state, mask = '']) => ({ act: oneOf(postActs, act), kind: oneOf(kinds, kind), state: oneOf(states, state), mask }))

  it.each(rows)('$act on a $state $kind', ({ act, kind, state, mask }) => {
    expect(mask).toHaveLength(actors.length)
    expect(allowed((actor) => can(actor, act, aPost({ kind, state })))).toEqual(namesOf(mask))
  })

  it('the table knows every act on every kind in every state, once', () => {
    const wanted = postActs.flatMap((act) => kinds.flatMap((kind) => states.map((state) => `${act} ${kind} ${state}`)))
    expect(rows.map((r) => `${r.act} ${r.kind} ${r.state}`).sort()).toEqual(wanted.sort())
  })

  it.each(rowsOf(makerReplyTable))('%s where a maker’s reply for %s is passed on', (act, scope, mask) => {
    const makerReply = oneOf(['bulletin', 'all-kits', 'one-serial'] as const, scope)
    const postAct: PostAct = oneOf(postActs, act)
    expect(allowed((actor) => can(actor, postAct, aPost({ makerReply })))).toEqual(namesOf(mask ?? ''))
  })

  it('whoever wrote one revision counts as its author, whoever wrote the others', () => {
    const shared = aPost({ authorIds: [99, 4] })
    const mentor = person(4, 'member', 'IC 042')
    expect(can(mentor, 'post.stamp', shared)).toBe(false)
    expect(can(mentor, 'post.edit', shared)).toBe(true)
  })
})

describe('who may do what else', () => {
  it.each(otherTable)('%s %s', (_act, _about, mask, ask) => {
    expect(mask).toHaveLength(actors.length)
    expect(allowed(ask)).toEqual(namesOf(mask))
  })
})

describe('the tables', () => {
  it('know every act there is', () => {
    expect([...new Set([...postActs, ...otherTable.map(([act]) => act)])].sort()).toEqual([...allActs].sort())
  })

  it('every act has words for its refusal', () => {
    for (const act of allActs) expect(whyNot[act]).toMatch(/\.$/)
  })
})
