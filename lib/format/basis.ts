// The names of a stamp's basis and of a maker's reply's scope, in full for sentences and in two lines for the stamp itself.
import type { Basis, ReplyScope } from '@/lib/domain/stamps/stamp-state'

const labels: Record<Basis, string> = {
  plans: 'Plans step',
  standard: 'Published standard',
  'own-build': 'Done on own build',
  'maker-reply': 'Kit maker’s written reply',
}

const lines: Record<Basis, readonly [string, string]> = {
  plans: ['Plans', 'step'],
  standard: ['Published', 'standard'],
  'own-build': ['Done on', 'own build'],
  'maker-reply': ['Maker’s', 'reply'],
}

const scopes: Record<ReplyScope, string> = {
  bulletin: 'bulletin',
  'all-kits': 'all kits',
  'one-serial': 'one serial only',
}

/** 'Published standard': for title blocks, forms and sentences. */
export function basisLabel(basis: Basis): string {
  return labels[basis]
}

/** The two lines at the top of an octagon; joined by a space they are the flat stamp's words. */
export function basisLines(basis: Basis): readonly [string, string] {
  return lines[basis]
}

/** 'all kits': how far a maker's reply reaches. */
export function scopeLabel(scope: ReplyScope): string {
  return scopes[scope]
}
