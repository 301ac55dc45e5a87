// Which rooms the navigation shows to whom. Asks the policy; rooms that do not exist yet are not here.
import type { BarItem, NavItem } from '@/components/layout/nav-items'
import { paths } from '@/lib/paths'
import type { Actor } from '@/lib/policy/actor'
import { can } from '@/lib/policy/can'

/** Header, phone bar and footer for this actor; `waiting` is how many notices are open. */
export function navigationFor(actor: Actor, waiting = 0): { rooms: NavItem[]; bar: BarItem[]; footer: NavItem[] } {
  const desk: NavItem[] = can(actor, 'desk.open') ? [{ href: paths.desk(), label: 'Desk' }] : []
  const people: NavItem[] = can(actor, 'people.open') ? [{ href: paths.people(), label: 'People' }] : []
  const me: NavItem = actor ? { href: paths.account, label: 'Account' } : { href: paths.signIn(), label: 'Sign in' }
  const notices: NavItem[] = waiting > 0 ? [{ href: paths.waiting, label: `Waiting (${waiting})` }] : []
  const kits: NavItem = { href: paths.kits, label: 'Kits' }
  const build: NavItem[] = can(actor, 'builds.keep') ? [{ href: paths.builds, label: 'My build' }] : []
  const shop: NavItem = { href: paths.shop, label: 'Shop tables' }
  return {
    rooms: [...notices, { href: paths.ask(), label: 'Ask' }, { href: paths.lesson(), label: 'Write a lesson' }, kits, shop, ...build, ...desk, ...people, me],
    bar: [
      { href: paths.search(), label: 'Search', icon: 'search' }, { href: paths.ask(), label: 'Ask', icon: 'ask' }, ...(build[0] ? [{ ...build[0], icon: 'kits' as const }] : [{ href: paths.lesson(), label: 'Lesson', icon: 'lesson' as const }]),
      // On a phone what waits takes the fourth place; desk and shop tables stand in the footer too.
      ...(notices[0] ? [{ ...notices[0], icon: 'attention' as const }] : desk[0] ? [{ ...desk[0], icon: 'desk' as const }] : [{ ...shop, icon: 'shop' as const }]), { ...me, icon: 'account' },
    ],
    footer: [...notices, { href: paths.lesson(), label: 'Write a lesson' }, kits, shop, ...build, ...desk, ...people, { href: paths.guide('how-stamps-work'), label: 'How stamps work' }, { href: paths.guide('cautions-and-limits'), label: 'Cautions and limits' }, { href: paths.guide('privacy'), label: 'Privacy' }],
  }
}
