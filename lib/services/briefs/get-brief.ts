// A section's brief: what a builder should know before they begin, in working order. A fixed number of statements whatever was written.
import 'server-only'
import { listCautionedPosts } from '@/db/queries/cautioned-post'
import { getSection, listOperations } from '@/db/queries/kits'
import { listBriefPosts, listClosingLines, listTaskSteps } from '@/db/queries/order'
import type { AppContext } from '@/lib/context'
import { countTools } from '@/lib/domain/briefs/count-tools'
import { describeHours } from '@/lib/domain/briefs/describe-hours'
import { unionCautions } from '@/lib/domain/cautions/group-cautions'
import type { MakerLimit } from '@/lib/domain/shop/maker-limits'
import type { Advice } from '@/lib/domain/order/weigh-advice'
import { refuse } from '@/lib/errors'
import { paths } from '@/lib/paths'
import type { Brief, BriefTask, Said } from '@/lib/schemas/brief'
import { loadMakerLimits } from '@/lib/services/kits/load-maker-limits'
import { choosePosts } from './choose-posts'
import { builderOf, gatherOrder, type GatheredOrder } from './gather-order'
import { noTask, presentTask, taskOf, type TaskStep } from './place-posts'
import { cautionsOf, presentLink, type BriefPost } from './present-items'

const plansWin = 'The plans win. The kit maker’s current plans and bulletins, your authority’s rules and a licensed mechanic come first.'

/** Throws not-found when there is no such section. */
export async function getBrief({ reader, now }: AppContext, kitSlug: string, code: string): Promise<Brief> {
  const place = await getSection(reader, kitSlug, code)
  if (!place) throw refuse.notFound('This section')
  const { kit, section } = place
  const steps = await listTaskSteps(reader, section.id)
  const gathered = await gatherOrder(reader, section, steps.map((s) => s.task))
  const chosen = choosePosts(await listBriefPosts(reader, section.id), postsBehind(gathered))
  const posts = postsById(await listCautionedPosts(reader, chosen.ids, 'plain'))
  const titles = await taskTitles(reader)
  const pick = (ids: readonly number[]) => ids.flatMap((id) => posts.get(id) ?? [])
  const byUse = { knowHow: pick(chosen.knowHow), lessons: pick(chosen.lessons), open: pick(chosen.open) }
  const { tasks, unplaced } = presentTasks(gathered.recommended.order, steps, titles, byUse, await loadMakerLimits(reader, kit.slug))
  return {
    kit: { slug: kit.slug, name: kit.name, maker: kit.maker }, section: { code: section.code, title: section.title, jasc: section.jasc },
    url: paths.brief(kit.slug, section.code), preparedAt: new Date(now).toISOString(), plansWin, cautions: unionCautions([...posts.values()].map(cautionsOf)),
    order: presentOrder(gathered, steps, titles, posts), tasks, unplaced, hours: describeHours(gathered.hours), tools: presentTools([...byUse.knowHow, ...byUse.lessons]),
    closing: await listClosingLines(reader, section.id), postsLeftOut: chosen.leftOut,
  }
}

type Titles = ReadonlyMap<string, string>

async function taskTitles(reader: AppContext['reader']): Promise<Titles> {
  return new Map((await listOperations(reader)).flatMap((o) => o.tasks.map((t) => [t.slug, t.title] as const)))
}

/** Visible posts only, whatever was asked for: one may have been withdrawn between two statements. */
function postsById(found: Awaited<ReturnType<typeof listCautionedPosts>>): Map<number, BriefPost> {
  const visible = new Map(found.filter((p) => p.state === 'visible').map((p) => [p.id, p]))
  return new Map([...visible.values()].flatMap((p): [number, BriefPost][] => {
    const question = p.parentId === null ? null : (visible.get(p.parentId) ?? undefined)
    return question === undefined ? [] : [[p.id, { found: p, question }]]
  }))
}

const postsBehind = ({ recommended: { departures, disagreements } }: GatheredOrder): number[] =>
  [...new Set([...disagreements.flatMap((d) => d.advice), ...departures.map((d) => d.advice)].flatMap((a) => a.postIds))]

function presentTasks(order: readonly string[], steps: readonly TaskStep[], titles: Titles, { knowHow, lessons, open }: Record<'knowHow' | 'lessons' | 'open', BriefPost[]>, limits: readonly MakerLimit[]) {
  const at = (task: string) => (post: BriefPost) => taskOf(post, order, steps) === task
  const present = (slug: string): BriefTask => presentTask({ slug, title: slug === noTask ? 'Anywhere in this section' : (titles.get(slug) ?? slug) }, steps,
    { knowHow: knowHow.filter(at(slug)), lessons: lessons.filter(at(slug)), open: open.filter(at(slug)) }, limits)
  const used = new Set([...knowHow, ...lessons, ...open].map((post) => taskOf(post, order, steps)))
  // The steward's own list of tasks is in working order too, so it says where the others may stand.
  const others = [...titles.keys(), ...[...used].filter((slug) => !titles.has(slug)).sort()].filter((slug) => used.has(slug) && !order.includes(slug))
  return { tasks: order.map(present), unplaced: others.map(present) }
}

function presentOrder({ recommended, advice, builders, ownBuilders, otherKits }: GatheredOrder, steps: readonly TaskStep[], titles: Titles, posts: ReadonlyMap<number, BriefPost>): Brief['order'] {
  const name = (slug: string) => ({ slug, title: titles.get(slug) ?? slug })
  const said = (a: Advice): Said => ({ before: name(a.before), after: name(a.after), builders: a.builders, posts: a.postIds.flatMap((id) => { const post = posts.get(id); return post ? [presentLink(post)] : [] }) })
  const next = (task: string, i: number) => advice.find((a) => a.before === task && a.after === recommended.order[i + 1])
  return {
    tasks: recommended.order, hasBaseLine: steps.length > 0, builders, ownBuilders, otherKits, departures: recommended.departures.map((d) => said(d.advice)),
    disagreements: recommended.disagreements.map((d) => ({
      kind: d.kind, tasks: d.tasks.map(name), sides: d.advice.map(said), followed: d.followed ? { before: d.followed.before, after: d.followed.after } : null,
    })),
    straightOn: recommended.order.flatMap((task, i) => { const a = next(task, i); return a ? [{ before: a.before, after: a.after, builders: a.builders }] : [] }),
  }
}

/** A tool's name is a builder's own words, so it takes the cautions of the posts that name it. */
function presentTools(posts: readonly BriefPost[]): Brief['tools'] {
  const byId = new Map(posts.map((post) => [post.found.id, post]))
  const told = posts.flatMap(({ found: { id, author, current: { parts } } }) => {
    const text = parts?.['tools']
    return typeof text === 'string' ? [{ builder: builderOf({ id: author.id, name: author.name, postId: id }), text, postId: id }] : []
  })
  return countTools(told).map(({ name, builders, postIds }) => ({ name, builders, cautions: unionCautions(postIds.flatMap((id) => { const post = byId.get(id); return post ? [cautionsOf(post)] : [] })) }))
}
