// What hangs before a mentor: facts of posts, never their text. Which of them hang and in which order is lib/domain/desk.
import 'server-only'
import { and, countDistinct, eq, inArray, isNull, notInArray, or, sql, type SQL } from 'drizzle-orm'
import { alias } from 'drizzle-orm/sqlite-core'
import type { ReaderOrTransaction } from '../client'
import { askedFor, kit, operation, post, postOperation, postSection, section } from '../schema'
import { isVisible } from './cautioned-post'

export interface DeskFilters { kit?: string | undefined; section?: string | undefined; operation?: string | undefined }
/** Caution codes by signal word; a code in neither list is a NOTICE. The words are content, so the caller brings them. */
export interface CodesByWord { warning: readonly string[]; caution: readonly string[] }

const entry = alias(post, 'entry')
const isTrue = (condition: SQL) => sql<number>`(${condition})`.mapWith(Boolean)

/** The gravest standing caution of a post: 3 WARNING, 2 CAUTION, 1 NOTICE, 0 none. */
const worstOf = ({ warning, caution }: CodesByWord) => sql<number>`coalesce((select max(case
  when c.code in ${[...warning]} then 3 when c.code in ${[...caution]} then 2 else 1 end)
  from post_caution c where c.post_id = ${post.id} and c.waived_at is null), 0)`
const goingBy = sql<number>`(select count(*) from reliance r where r.post_id = ${post.id})`
const answers = sql<number>`(select count(*) from post a where a.parent_id = ${post.id} and a.state = 'visible')`
const isOwn = (mentorId: number) => sql`exists (select 1 from revision w where w.post_id = ${post.id} and w.author_id = ${mentorId})`
const isAskedFor = sql`exists (select 1 from asked_for f where f.post_id = ${post.id} and f.answered_at is null)`
const isForOneSerial = sql`exists (select 1 from revision w where w.post_id = ${post.id} and w.number = ${post.currentRevision} and w.maker_reply_scope = 'one-serial')`
/** A stamp that stands on what is there now: this revision of the post and of its question. */
const liveStamp = sql`select 1 from stamp s join member m on m.id = s.mentor_id where s.post_id = ${post.id} and s.revision = ${post.currentRevision} and s.withdrawn_at is null
  and s.question_revision = case when ${post.kind} = 'answer' then ${entry.currentRevision} else 0 end`
const isStampedBy = (mentorId: number) => sql`exists (${liveStamp} and s.mentor_id = ${mentorId})`
const isByGoneMentor = sql`exists (${liveStamp} and m.state <> 'active')`

/** A post that some mentor may have to look at; `railReason` decides for good. */
const wantsLook = or(
  and(eq(post.kind, 'question'), sql`not exists (select 1 from post a where a.parent_id = ${post.id} and a.state = 'visible')`),
  and(notInArray(post.kind, ['question']), notInArray(post.stampState, ['stamped'])),
  and(eq(post.stampState, 'stamped'), isByGoneMentor),
)

function inPlace(reader: ReaderOrTransaction, f: DeskFilters): SQL | undefined {
  const bySection = f.kit && f.section ? inArray(entry.id, reader.select({ id: postSection.postId }).from(postSection).innerJoin(section, eq(section.id, postSection.sectionId))
    .innerJoin(kit, eq(kit.id, section.kitId)).where(and(eq(kit.slug, f.kit), eq(section.code, f.section)))) : undefined
  const byOperation = f.operation ? inArray(entry.id, reader.select({ id: postOperation.postId }).from(postOperation).innerJoin(operation, eq(operation.id, postOperation.operationId))
    .where(eq(operation.slug, f.operation))) : undefined
  return and(bySection, byOperation)
}

/** Facts of at most `most` posts in visible entries; what is cut off can hurt least (the order of `orderRail`). `worst` is 3 WARNING … 0 none. */
export async function listDeskFacts(reader: ReaderOrTransaction, mentorId: number, codes: CodesByWord, filters: DeskFilters, most: number) {
  const worst = worstOf(codes)
  return reader.select({
    postId: post.id, entryId: entry.id, kind: post.kind, stampState: post.stampState, needsTwo: post.needsTwo, createdAt: post.createdAt, worst, goingBy, answers,
    isOwn: isTrue(isOwn(mentorId)), isStampedByMe: isTrue(isStampedBy(mentorId)), isAskedFor: isTrue(isAskedFor), isForOneSerial: isTrue(isForOneSerial), isByGoneMentor: isTrue(isByGoneMentor),
  }).from(post).innerJoin(entry, eq(entry.id, sql`coalesce(${post.parentId}, ${post.id})`))
    .where(and(isVisible, eq(entry.state, 'visible'), wantsLook, inPlace(reader, filters)))
    .orderBy(sql`${post.stampState} = 'in-question' desc, ${post.needsTwo} desc, ${worst} desc, ${goingBy} desc, ${post.createdAt}, ${post.id}`)
    .limit(most)
}

/** How many visible posts wait for what this mentor asked. */
export async function countAskedFor(reader: ReaderOrTransaction, mentorId: number): Promise<number> {
  const [row] = await reader.select({ n: countDistinct(askedFor.postId) }).from(askedFor).innerJoin(post, eq(post.id, askedFor.postId))
    .where(and(eq(askedFor.mentorId, mentorId), isNull(askedFor.answeredAt), isVisible))
  return row?.n ?? 0
}

/** What mentors wait for under these posts, oldest first. */
export async function listOpenRequests(reader: ReaderOrTransaction, postIds: readonly number[]) {
  if (postIds.length === 0) return []
  return reader.select({ postId: askedFor.postId, what: askedFor.what, createdAt: askedFor.createdAt }).from(askedFor)
    .where(and(inArray(askedFor.postId, [...postIds]), isNull(askedFor.answeredAt))).orderBy(askedFor.id)
}
