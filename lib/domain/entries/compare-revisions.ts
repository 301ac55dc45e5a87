// What changed between two revisions, field by field, as runs of words. Pure.
import { diffWordsWithSpace } from 'diff'

export interface Run { kind: 'same' | 'added' | 'removed'; text: string }
export interface FieldChange { label: string; runs: Run[] }

/** Fields that differ, in the order of `after`, with word runs; a field on one side only is wholly added or removed. */
export function compareRevisions(before: readonly (readonly [label: string, text: string])[], after: readonly (readonly [label: string, text: string])[]): FieldChange[] {
  const labels = [...new Set([...after, ...before].map(([label]) => label))]
  const textOf = (side: readonly (readonly [string, string])[], label: string) => side.find(([l]) => l === label)?.[1] ?? ''
  return labels.flatMap((label) => {
    const [from, to] = [textOf(before, label), textOf(after, label)]
    if (from === to) return []
    // Past 200 ms the comparison gives up and shows both texts whole: readable, and never a stalled server.
    const parts = diffWordsWithSpace(from, to, { timeout: 200 })
    const runs = parts?.map((p): Run => ({ kind: p.added ? 'added' : p.removed ? 'removed' : 'same', text: p.value })) ?? [{ kind: 'removed' as const, text: from }, { kind: 'added' as const, text: to }]
    return [{ label, runs }]
  })
}
