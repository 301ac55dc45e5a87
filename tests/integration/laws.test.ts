// The laws of db/laws.sql, each broken on purpose. A trigger that is missing, or that no test here breaks, fails the first test.
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { migrateDatabase, schemaMismatch } from '@/db/migrate'
import { openTestRuntime, type TestRuntime } from '../support/database'
import { aMember, aMentor, anAnswer, anEntry, type Somebody } from '../support/factories'
import { api } from '../support/api'

let runtime: TestRuntime
let ids: { question: number; answer: number; lesson: number; oneSerial: number; author: number; mentor: number; mark: string; builder: number; steward: number; stamp: number; remark: number }
const sql = (statement: string) => runtime.database.client.execute(statement)

beforeAll(async () => {
  runtime = await openTestRuntime()
  const [mentor, steward, builder] = [await aMentor(), await aMember({ role: 'steward' }), await aMember()]
  const question = await anEntry()
  const answer = await anAnswer({ question })
  const lesson = await anEntry({ kind: 'lesson' })
  const oneSerial = await anAnswer({ question, makerReply: 'one-serial' })
  const stamped = await api('POST', `/api/posts/${answer.id}/stamps`, { token: mentor.token, body: { revision: 'A', basis: 'standard', reference: 'ch. 4' } })
  const remarked = await api('POST', `/api/posts/${answer.id}/remarks`, { token: builder.token, body: { body: 'x' } })
  const put = (by: Somebody, what: string, body: object) => api('PUT', `/api/posts/${answer.id}/${what}`, { token: by.token, body })
  await put(builder, 'outcome', { result: 'as-written' })
  await put(builder, 'reliance', {})
  await sql(`insert into post_caution (post_id, code, origin, because, created_at) values (${answer.id}, 'eyes', 'moderator', 'x', 1)`)
  await sql(`insert into kit_limit (kit_id, shop_table, result, inputs, value, unit, display, reference, created_at) values (1, 'rivet', 'edge-centre', '{}', '{"min":2}', 'D', '{}', '{}', 1)`)
  await sql(`insert into mentorship (member_id, number, fields, reason, granted_by, created_at) values (${answer.by.id}, 'OW 001', 'x', 'x', ${steward.id}, 1)`)
  // Only one steward may be left for the law about the last one.
  await sql(`update member set role = 'member' where role = 'steward' and id <> ${steward.id}`)
  ids = { question: question.id, answer: answer.id, lesson: lesson.id, oneSerial: oneSerial.id, author: answer.by.id, mentor: mentor.id, mark: mentor.mark, builder: builder.id, steward: steward.id, stamp: stamped.body.id, remark: remarked.body.id }
})
afterAll(() => runtime.close())

const aStamp = (postId: number, { mentor = ids.mentor, mark = ids.mark, revision = 1, questionRevision = 1, scope = 'null', basis = 'standard' } = {}) =>
  `insert into stamp (post_id, revision, question_revision, mentor_id, mark, basis, reference, scope, created_at) values (${postId}, ${revision}, ${questionRevision}, ${mentor}, '${mark}', '${basis}', 'x', ${scope}, ${Date.now()})`
const aRevision = (postId: number, number: number) =>
  `insert into revision (post_id, number, sections, tasks, operations, hardware, plans, order_advice, body, content_hash, created_at) values (${postId}, ${number}, '[]', '[]', '[]', '[]', '[]', '[]', 'x', 'x', 1)`
const aMark = (table: 'outcome' | 'reliance', postId: number, by: number) => table === 'outcome'
  ? `insert into outcome (post_id, member_id, revision, result, note, created_at) values (${postId}, ${by}, 1, 'as-written', '', 1)`
  : `insert into reliance (post_id, member_id, revision, created_at) values (${postId}, ${by}, 1, 1)`

/** For each trigger that refuses: statements that break its law, and words of the refusal. */
const broken: Record<string, { says: string; by: () => string[] }> = {
  revision_without_gaps: { says: 'without gaps', by: () => [aRevision(ids.answer, 3), aRevision(ids.answer, 1)] },
  revision_never_changes: { says: 'a revision never changes', by: () => [
    `update revision set body = 'y' where post_id = ${ids.answer}`, `update revision set author_id = ${ids.builder} where post_id = ${ids.answer}`,
    `update revision set body = 'y', redacted_reason = 'z', content_hash = 'other' where post_id = ${ids.answer}`,
  ] },
  revision_never_deleted: { says: 'never deleted', by: () => [`delete from revision where post_id = ${ids.lesson}`] },
  post_never_deleted: { says: 'hidden, never deleted', by: () => [`delete from post where id = ${ids.lesson}`] },
  post_keeps_its_place: { says: 'keeps its kind, parent and author', by: () => [
    `update post set author_id = ${ids.builder} where id = ${ids.answer}`, `update post set parent_id = null, kind = 'lesson' where id = ${ids.answer}`, `update post set created_at = 1 where id = ${ids.answer}`,
  ] },
  post_answers_a_question: { says: 'only a question has answers', by: () => [ids.lesson, ids.answer].map((id) => `insert into post (kind, parent_id, current_revision, created_at, updated_at) values ('answer', ${id}, 1, 1, 1)`) },
  stamp_not_on_own_words: { says: 'their own words', by: () => [aStamp(ids.answer, { mentor: ids.author, mark: 'OW 001' })] },
  stamp_not_on_a_question: { says: 'answered, not stamped', by: () => [aStamp(ids.question, { questionRevision: 0 })] },
  stamp_only_by_a_mentor: { says: 'mentorship was granted', by: () => [aStamp(ids.answer, { mentor: ids.builder }), aStamp(ids.answer, { mark: 'XX 999' })] },
  stamp_not_for_one_serial: { says: 'one serial cannot be stamped', by: () => [aStamp(ids.oneSerial), aStamp(ids.answer, { basis: 'maker-reply', scope: "'one-serial'" })] },
  stamp_names_the_questions_revision: { says: 'names the revision of its question', by: () => [aStamp(ids.answer, { questionRevision: 9 }), aStamp(ids.answer, { questionRevision: 0 })] },
  limit_only_ended: { says: 'only be ended', by: () => [
    `update kit_limit set value = '{}'`, `update kit_limit set ended_at = 1`, `update kit_limit set ended_at = 1, end_reason = 'x', unit = 'in'`,
  ] },
  limit_never_deleted: { says: 'ended, never deleted', by: () => ['delete from kit_limit'] },
  stamp_only_withdrawn: { says: 'only be withdrawn', by: () => [
    `update stamp set basis = 'plans' where id = ${ids.stamp}`, `update stamp set revision = 2 where id = ${ids.stamp}`, `update stamp set withdrawn_at = 1 where id = ${ids.stamp}`,
    `update stamp set withdrawn_at = 1, withdrawn_reason = 'x', mark = 'XX 999' where id = ${ids.stamp}`,
  ] },
  stamp_never_deleted: { says: 'withdrawn, never deleted', by: () => [`delete from stamp where id = ${ids.stamp}`] },
  outcome_not_on_own_words: { says: 'what somebody else advised', by: () => [aMark('outcome', ids.answer, ids.author), aMark('outcome', ids.question, ids.builder)] },
  reliance_not_on_own_words: { says: 'never by a reply for one serial', by: () => [aMark('reliance', ids.answer, ids.author), aMark('reliance', ids.question, ids.builder), aMark('reliance', ids.oneSerial, ids.builder)] },
  caution_stays: { says: 'a caution stays until waived', by: () => [`delete from post_caution where post_id = ${ids.answer}`] },
  caution_only_waived: { says: 'acknowledged, waived or required again', by: () => [
    `update post_caution set code = 'hearing' where post_id = ${ids.answer}`, `update post_caution set post_id = ${ids.lesson} where post_id = ${ids.answer}`, `update post_caution set created_at = 2 where post_id = ${ids.answer}`,
  ] },
  last_steward_stays: { says: 'last steward cannot be demoted', by: () => [`update member set role = 'member' where id = ${ids.steward}`, `update member set state = 'suspended' where id = ${ids.steward}`, `update member set state = 'closed', role = 'member' where id = ${ids.steward}`] },
  audit_is_chained: { says: 'the hash of the one before', by: () => [`insert into audit (at, verb, subject, previous_hash, hash) values (1, 'x', 'y', 'made up', 'z')`, `insert into audit (at, verb, subject, previous_hash, hash) values (1, 'x', 'y', '', 'z')`] },
  audit_never_changes: { says: 'append-only', by: () => [`update audit set verb = 'nothing happened'`] },
  audit_never_deleted: { says: 'append-only', by: () => [`delete from audit where sequence = (select max(sequence) from audit)`] },
}

/** For each trigger that feeds the change log: something others can see, and whose entry search must look at again. */
const seen: Record<string, { entry: () => number; by: () => string }> = {
  change_post_inserted: { entry: () => ids.question, by: () => `insert into post (kind, parent_id, current_revision, created_at, updated_at) values ('answer', ${ids.question}, 1, 1, 1)` },
  change_post_updated: { entry: () => ids.question, by: () => `update post set state = 'hidden' where id = ${ids.oneSerial}` },
  change_revision: { entry: () => ids.lesson, by: () => `update revision set body = '', redacted_reason = 'a name in it' where post_id = ${ids.lesson}` },
  change_stamp_inserted: { entry: () => ids.lesson, by: () => aStamp(ids.lesson, { questionRevision: 0 }) },
  change_stamp_updated: { entry: () => ids.question, by: () => `update stamp set withdrawn_at = 1, withdrawn_reason = 'x' where id = ${ids.stamp}` },
  change_caution_inserted: { entry: () => ids.question, by: () => `insert into post_caution (post_id, code, origin, because, created_at) values (${ids.answer}, 'hearing', 'rule', 'x', 1)` },
  change_caution_updated: { entry: () => ids.question, by: () => `update post_caution set waived_at = 1, waived_reason = 'x' where post_id = ${ids.answer} and code = 'eyes'` },
  change_remark_inserted: { entry: () => ids.lesson, by: () => `insert into remark (post_id, body, created_at) values (${ids.lesson}, 'x', 1)` },
  change_remark_updated: { entry: () => ids.question, by: () => `update remark set state = 'hidden' where id = ${ids.remark}` },
  change_outcome_inserted: { entry: () => ids.lesson, by: () => aMark('outcome', ids.lesson, ids.builder) },
  change_outcome_updated: { entry: () => ids.question, by: () => `update outcome set result = 'did-not-work', note = 'x' where post_id = ${ids.answer}` },
  change_reliance_inserted: { entry: () => ids.lesson, by: () => aMark('reliance', ids.lesson, ids.builder) },
  change_reliance_deleted: { entry: () => ids.question, by: () => `delete from reliance where post_id = ${ids.answer}` },
}

const triggers = async () => (await sql("select name from sqlite_master where type = 'trigger' order by name")).rows.map((r) => String(r['name']))

describe('the laws of the data', () => {
  it('are all there, and each is tried below', async () => {
    expect(await triggers()).toEqual([...Object.keys(broken), ...Object.keys(seen), 'redaction_takes_all'].sort())
  })

  it.each(Object.entries(broken))('%s refuses', async (_, { says, by }) => {
    for (const statement of by()) await expect(sql(statement), statement).rejects.toThrow(new RegExp(`law: .*${says}`))
  })

  it.each(Object.entries(seen))('%s tells search which entry to look at again', async (_, { entry, by }) => {
    const before = (await sql('select coalesce(max(sequence), 0) as n from change')).rows[0]!['n']
    await sql(by())
    const rows = (await sql(`select post_id from change where sequence > ${Number(before)}`)).rows
    expect(rows.map((r) => r['post_id'])).toContain(entry())
  })

  it('every column of a post but the parser that measured it is a change that others see', async () => {
    const columns = (await sql("select name from pragma_table_info('post')")).rows.map((r) => String(r['name'])).filter((name) => name !== 'measured_by')
    const law = String((await sql("select sql from sqlite_master where name = 'change_post_updated'")).rows[0]?.['sql'])
    expect(law.match(/UPDATE OF([\w\s,]+) ON post/)?.[1]?.split(',').map((c) => c.trim()).sort()).toEqual(columns.sort())
  })

  it('a redaction takes what was made of the text with it', async () => {
    const { id } = await anAnswer({ body: 'Drill it #30.' })
    const kept = async () => [
      (await sql(`select 1 from measurement where post_id = ${id}`)).rows.length, (await sql(`select 1 from rendering where key = 'post:${id}:1'`)).rows.length,
    ]
    expect(await kept()).toEqual([1, 1])
    await sql(`update revision set body = '', redacted_reason = 'a name in it' where post_id = ${id}`)
    expect(await kept()).toEqual([0, 0])
  })

  it('a stamp names a revision of its own post', async () => {
    await expect(sql(aStamp(ids.lesson, { revision: 7, questionRevision: 0 }))).rejects.toThrow(/FOREIGN KEY/)
  })

  it('a steward redacts a revision once, and its hash stays', async () => {
    const { lesson } = ids
    const hash = async () => (await sql(`select content_hash from revision where post_id = ${lesson}`)).rows[0]!['content_hash']
    const before = await hash()
    await expect(sql(`update revision set body = 'again', redacted_reason = 'again' where post_id = ${lesson}`)).rejects.toThrow(/never changes/)
    expect(await hash()).toBe(before)
  })

  it('come back when a migration runs again after one was lost, and a start without them is refused', async () => {
    const all = await triggers()
    await sql('drop trigger stamp_never_deleted')
    await sql("update setting set value = 'older' where key = 'laws'")
    expect(await schemaMismatch(runtime.database)).toContain('laws')
    await migrateDatabase(runtime.database)
    expect(await triggers()).toEqual(all)
    expect(await schemaMismatch(runtime.database)).toBeNull()
  })
})
