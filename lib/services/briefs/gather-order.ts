// The order of a section's tasks from what builders said and did: lessons' advice and debriefs, from other kits too where a section has little of its own.
import 'server-only'
import { listDebriefOrders, listLessonAdvice, listSameSystem } from '@/db/queries/order'
import type { ReaderOrTransaction } from '@/db/client'
import type { HoursTold } from '@/lib/domain/briefs/describe-hours'
import { recommendOrder, type RecommendedOrder } from '@/lib/domain/order/recommend-order'
import { weighAdvice, type Advice, type Voice } from '@/lib/domain/order/weigh-advice'

/** With fewer builders than this, other kits' sections on the same system speak too. */
const enoughBuilders = 3

export interface GatheredOrder {
  recommended: RecommendedOrder
  advice: Advice[]
  builders: number
  ownBuilders: number
  otherKits: { kit: string; section: string; title: string; builders: number }[]
  /** Of the section itself only. */
  hours: HoursTold[]
}

/** Three statements, whatever the number of posts. */
export async function gatherOrder(reader: ReaderOrTransaction, section: { id: number; kitId: number; jasc: string | null }, baseLine: readonly string[]): Promise<GatheredOrder> {
  const others = await listSameSystem(reader, section)
  const ids = [section.id, ...others.map((other) => other.id)]
  const told = [...lessonsAsTold(await listLessonAdvice(reader, ids)), ...debriefsAsTold(await listDebriefOrders(reader, ids))]
  const own = told.filter((t) => t.sectionId === section.id)
  const ownBuilders = countBuilders(own.flatMap((t) => t.voices))
  const asked = ownBuilders >= enoughBuilders ? [] : others
  const heard = told.filter((t) => t.sectionId === section.id || asked.some((other) => other.id === t.sectionId)).flatMap((t) => t.voices)
  const advice = weighAdvice(heard)
  return {
    recommended: recommendOrder(baseLine, advice), advice, builders: countBuilders(heard), ownBuilders,
    otherKits: asked.map((other) => ({ kit: other.kit, section: other.code, title: other.title, builders: countBuilders(told.filter((t) => t.sectionId === other.id).flatMap((t) => t.voices)) })).filter((o) => o.builders > 0),
    hours: own.flatMap((t) => t.hours),
  }
}

interface Told { sectionId: number; voices: Voice[]; hours: HoursTold[] }

function lessonsAsTold(rows: Awaited<ReturnType<typeof listLessonAdvice>>): Told[] {
  return rows.map(({ sectionId, postId, authorId, authorName, at, orderAdvice, hours }) => {
    const builder = builderOf({ id: authorId, name: authorName, postId })
    return {
      sectionId, voices: orderAdvice.map(({ before, after }) => ({ builder, before, after, postId, at })),
      hours: typeof hours === 'number' ? [{ builder, hours, at }] : [],
    }
  })
}

/** A member's newest debrief of a section speaks: each task before the one that they did next. */
function debriefsAsTold(rows: Awaited<ReturnType<typeof listDebriefOrders>>): Told[] {
  const seen = new Set<string>()
  return rows.flatMap(({ sectionId, memberId, at, taskOrder, minutes }) => {
    const key = `${sectionId}:${memberId}`
    if (seen.has(key)) return []
    seen.add(key)
    const builder = builderOf({ id: memberId, name: null, postId: 0 })
    const voices = taskOrder.slice(1).map((after, i) => ({ builder, before: taskOrder[i] ?? after, after, postId: null, at }))
    return [{ sectionId, voices, hours: minutes === null ? [] : [{ builder, hours: minutes / 60, at }] }]
  })
}

/** Whose voice it is: a member, or the plain name of an import. A post without a name is a voice of its own. */
export const builderOf = ({ id, name, postId }: { id: number | null; name: string | null; postId: number }): string =>
  id !== null ? `member:${id}` : name !== null ? `name:${name}` : `post:${postId}`

const countBuilders = (voices: readonly { builder: string }[]) => new Set(voices.map((v) => v.builder)).size
