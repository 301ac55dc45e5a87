// The one place that decides who may. Pure and total: services ask it to act, pages ask it to show a button.
import type { Actor, Role } from './actor'

/** What hangs on a post, as far as it matters for who may touch it. */
export interface PostSubject {
  kind: 'question' | 'lesson' | 'answer'
  state: 'visible' | 'hidden' | 'merged' | 'withdrawn'
  /** Everybody who wrote a revision of it. */
  authorIds: readonly number[]
  /** Set when it passes on a kit maker's reply. */
  makerReply?: 'bulletin' | 'all-kits' | 'one-serial' | null
}

/** Every act the product knows, with the subject it is about. */
export interface Acts {
  'read': { publicReading: boolean }
  'post.read': PostSubject
  'post.write': undefined
  'post.edit': PostSubject
  'post.remark': PostSubject
  'post.stamp': PostSubject
  'post.ask-for': PostSubject
  'post.tell-how-it-went': PostSubject
  'post.go-by': PostSubject
  'post.set-cautions': PostSubject
  'post.hide': PostSubject
  'stamp.withdraw': { mentorId: number | null }
  'desk.open': undefined
  'search.explain': undefined
  'evidence.open': undefined
  'people.open': undefined
  'people.set-role': { memberId: number }
  'people.set-state': { memberId: number; role: Role }
  'people.grant-mentorship': { memberId: number }
  'kit.set-limits': undefined
  'kits.keep': undefined
  'notice.close': { memberId: number }
  'import': undefined
  'account.open': undefined
  'builds.keep': undefined
  'build.open': { ownerId: number }
}
export type Act = keyof Acts

const ladder: Record<Role, number> = { member: 1, moderator: 2, steward: 3 }
const isAtLeast = (actor: Actor, role: Role) => actor !== null && ladder[actor.role] >= ladder[role]

type Rule<A extends Act> = (actor: Actor, subject: Acts[A]) => boolean
const isOwn = (actor: Actor, post: PostSubject) => actor !== null && post.authorIds.includes(actor.id)
const isAdvice = (post: PostSubject) => post.kind !== 'question' && post.state === 'visible'
const isOpen = (post: PostSubject) => post.state === 'visible'

const rules: { [A in Act]: Rule<A> } = {
  'read': (actor, s) => actor !== null || s.publicReading,
  // A withdrawn post opens under its notice; a hidden one is seen by its author and by moderators.
  'post.read': (actor, post) => post.state === 'visible' || post.state === 'withdrawn' || isOwn(actor, post) || isAtLeast(actor, 'moderator'),
  'post.write': (actor) => actor !== null,
  'post.edit': (actor, post) => isOpen(post) && isOwn(actor, post),
  'post.remark': (actor, post) => actor !== null && isOpen(post),
  'post.stamp': (actor, post) => actor?.mark != null && isAdvice(post) && !isOwn(actor, post) && post.makerReply !== 'one-serial',
  'post.ask-for': (actor, post) => actor?.mark != null && isOpen(post) && !isOwn(actor, post),
  'post.tell-how-it-went': (actor, post) => actor !== null && isAdvice(post) && !isOwn(actor, post),
  'post.go-by': (actor, post) => actor !== null && isAdvice(post) && !isOwn(actor, post) && post.makerReply !== 'one-serial',
  'post.set-cautions': (actor) => isAtLeast(actor, 'moderator'),
  'post.hide': (actor) => isAtLeast(actor, 'moderator'),
  'stamp.withdraw': (actor, stamp) => actor !== null && stamp.mentorId === actor.id,
  'desk.open': (actor) => actor?.mark != null,
  'search.explain': (actor) => isAtLeast(actor, 'steward'),
  'evidence.open': (actor) => actor?.mark != null || isAtLeast(actor, 'steward'),
  'people.open': (actor) => isAtLeast(actor, 'steward'),
  'people.set-role': (actor) => isAtLeast(actor, 'steward'),
  // A moderator suspends builders; only a steward suspends those who moderate. Nobody suspends themselves.
  'people.set-state': (actor, s) => actor !== null && actor.id !== s.memberId && (isAtLeast(actor, 'steward') || (isAtLeast(actor, 'moderator') && s.role === 'member')),
  'people.grant-mentorship': (actor, s) => isAtLeast(actor, 'steward') && actor?.id !== s.memberId,
  'kit.set-limits': (actor) => isAtLeast(actor, 'steward'),
  'kits.keep': (actor) => isAtLeast(actor, 'steward'),
  'notice.close': (actor, notice) => actor !== null && actor.id === notice.memberId,
  'import': (actor) => isAtLeast(actor, 'steward'),
  'account.open': (actor) => actor !== null,
  'builds.keep': (actor) => actor !== null,
  // Private whatever the role: neither moderators nor stewards look into somebody's garage.
  'build.open': (actor, build) => actor !== null && actor.id === build.ownerId,
}

/** Whether `actor` may do `act` on `subject`. */
export function can<A extends Act>(actor: Actor, act: A, ...[subject]: Acts[A] extends undefined ? [] : [Acts[A]]): boolean {
  const rule: (actor: Actor, subject: Acts[A]) => boolean = rules[act]
  return rule(actor, subject as Acts[A])
}

/** The list of acts, for the table-driven test. */
export const allActs = Object.keys(rules) as Act[]
