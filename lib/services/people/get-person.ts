// A member's sheet as everybody may read it: who they are, whether they stamp, what they wrote lately.
import 'server-only'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { getMember, listMentorships, listRecentPosts } from '@/db/queries/people'
import type { AppContext } from '@/lib/context'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import { refuse } from '@/lib/errors'
import type { Role } from '@/lib/policy/actor'
import type { Caution } from '@/lib/schemas/post'
import { presentCautions } from '@/lib/services/posts/present-post'

export interface WrittenLine { postId: number; entryId: number; kind: 'question' | 'lesson' | 'answer'; title: string; cautions: Caution[]; createdAt: number }
export interface PersonSheet {
  id: number
  name: string
  bio: string
  role: Role
  state: 'active' | 'suspended' | 'closed'
  createdAt: number
  mentor: { mark: string; fields: string; since: number } | null
  written: WrittenLine[]
}

const mostLines = 20

/** 404 when nobody is there. Titles come with their cautions, those of an answer's question included. */
export async function getPerson(context: AppContext, memberId: number): Promise<PersonSheet> {
  const found = await getMember(context.reader, memberId)
  if (!found) throw refuse.notFound('This member')
  const [mentorships, recent] = await Promise.all([listMentorships(context.reader, memberId), listRecentPosts(context.reader, memberId, mostLines)])
  const posts = new Map((await listCautionedPosts(context.reader, [...new Set(recent.flatMap((r) => [r.id, r.entryId]))])).map((p) => [p.id, p]))
  const live = mentorships.find((m) => m.endedAt === null)
  const { id, name, bio, role, state, createdAt } = found.member
  return {
    id, name, bio, role, state, createdAt, mentor: live ? { mark: live.number, fields: live.fields, since: live.createdAt } : null,
    written: recent.flatMap((r): WrittenLine[] => {
      const post = posts.get(r.id)
      const entry = posts.get(r.entryId)
      if (!post || !entry) return []
      const cautions = unionCautions([presentCautions(post), presentCautions(entry)]).filter((c) => c.waived === undefined)
      return [{ postId: post.id, entryId: entry.id, kind: post.kind, title: entry.current.title, cautions, createdAt: post.createdAt }]
    }),
  }
}
