// Words for a refusal: what the person can do about it. Beside can.ts so that both change together.
import type { Act } from './can'

/** A sentence for each act that was refused. */
export const whyNot: Record<Act, string> = {
  'read': 'This group reads behind a sign-in.',
  'post.read': 'This post is hidden.',
  'post.write': 'Sign in to write.',
  'post.edit': 'Only its author edits a post.',
  'post.remark': 'Sign in to remark; hidden posts take no remarks.',
  'post.stamp': 'Only a mentor stamps, never on their own words, and never a reply for one serial.',
  'post.ask-for': 'Only a mentor asks for more, and never of themselves.',
  'post.tell-how-it-went': 'How it went is told by members of advice that somebody else wrote.',
  'post.go-by': 'Members go by advice that somebody else wrote; a reply for one serial holds for that aeroplane alone.',
  'post.set-cautions': 'Moderators set cautions.',
  'post.hide': 'Moderators hide and restore.',
  'stamp.withdraw': 'A stamp is withdrawn by the mentor who pressed it.',
  'desk.open': 'The desk is for mentors.',
  'search.explain': 'Why results stand where they stand is shown to stewards.',
  'evidence.open': 'This page is for mentors and stewards.',
  'people.open': 'This page is for stewards.',
  'people.set-role': 'Stewards change roles.',
  'people.set-state': 'Moderators suspend builders, stewards anyone but themselves.',
  'people.grant-mentorship': 'Mentorship is granted by a steward to somebody else.',
  'kit.set-limits': 'Stewards enter and end the kit maker’s limits.',
  'kits.keep': 'Stewards keep plan steps, lists and bulletins.',
  'notice.close': 'What waits for somebody is theirs to close.',
  'import': 'Stewards import.',
  'account.open': 'Sign in to see your account.',
  'builds.keep': 'Sign in to keep a build.',
  'build.open': 'A build is open to its owner alone.',
}
