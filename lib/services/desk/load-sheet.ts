// One open sheet of the desk: the whole text of the question and of the advice, and what the mentor may do with it.
import 'server-only'
import { listOpenRequests } from '@/db/queries/desk'
import { getKit } from '@/db/queries/kits'
import type { AppContext } from '@/lib/context'
import { AppError } from '@/lib/errors'
import type { Member } from '@/lib/policy/actor'
import { checkNumbers } from '@/lib/domain/numbers-check/check-numbers'
import type { NumbersCheck } from '@/lib/domain/numbers-check/numbers-check'
import { can } from '@/lib/policy/can'
import type { AskFor } from '@/lib/schemas/acts'
import type { Answer, Entry } from '@/lib/schemas/post'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { loadEntry } from '@/lib/services/posts/load-entry'

export interface DeskSheet {
  entry: Entry
  /** What is judged: a row of the question, or the lesson itself; the question itself while it is open. */
  post: Entry | Answer
  /** 1, 2, 3 … of an answer, as on the question's page. */
  row: number | null
  maker: string | undefined
  /** '5712 Wing ribs to spar': JASC code and title of each section. */
  systems: string[]
  /** Its numbers against the shop tables. */
  checks: NumbersCheck[]
  mayStamp: boolean
  mayAsk: boolean
  /** What its author was asked for and has not answered. */
  requests: AskFor['what'][]
}

/** Null when the entry or the post is not to be seen any more. */
export async function loadSheet(context: AppContext & { actor: Member }, entryId: number, postId: number): Promise<DeskSheet | null> {
  const entry = await entryOrNull(context, entryId)
  const row = entry ? entry.answers.findIndex((a) => a.id === postId) : -1
  const post = entry?.id === postId ? entry : entry?.answers[row]
  if (!entry || !post || entry.state !== 'visible') return null
  const [kit, requests, limits] = await Promise.all([getKit(context.reader, entry.kit), listOpenRequests(context.reader, [postId]), loadMakerLimits(context.reader, entry.kit)])
  const subject = {
    kind: post.kind, state: post.state, authorIds: post.revisions.flatMap((r) => r.author.id ?? []),
    makerReply: 'makerReply' in post ? (post.makerReply ?? null) : null,
  }
  const standsMine = post.stamps.some((s) => s.live && s.mentor.id === context.actor.id) && post.stamp !== 'in-question'
  return {
    entry, post, row: row < 0 ? null : row + 1, maker: kit?.maker,
    systems: entry.sections.flatMap((code) => kit?.sections.find((s) => s.code === code) ?? []).map((s) => (s.jasc ? `${s.jasc} ${s.title}` : s.title)),
    checks: checkNumbers(post.text, { tasks: entry.tasks, hardware: entry.hardware, limits }),
    mayStamp: can(context.actor, 'post.stamp', subject) && !standsMine,
    mayAsk: can(context.actor, 'post.ask-for', subject),
    requests: requests.map((r) => r.what),
  }
}

async function entryOrNull(context: AppContext, entryId: number): Promise<Entry | null> {
  try {
    return await loadEntry(context, entryId)
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') return null
    throw error
  }
}
