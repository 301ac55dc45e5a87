// The numbers check of a page's posts: what agrees with a shop table, what differs, what was measured, each with its source.
import Link from 'next/link'
import { Sheet, SheetHead } from '@/components/entries/sheet'
import type { NumbersCheckItem } from '@/lib/schemas/numbers-check'
import { paths } from '@/lib/paths'

export interface CheckedPost { label: string; checks: readonly NumbersCheckItem[] }

const marks = { agrees: '=', conflicts: '≠', 'cannot-tell': '?' } as const
const words = { agrees: 'agrees with the table', conflicts: 'differs from the table', 'cannot-tell': 'the table cannot tell' } as const
const basisWords: Record<string, string> = { memory: 'from memory, not checked against the standard', 'common-practice': 'common practice, no source', maker: 'the kit maker’s own limit' }

interface NumbersCheckProps {
  posts: readonly CheckedPost[]
  /** Slug of the kit they are about: a link to a table then shows its maker's own limits too. */
  kit?: string | undefined
}

/** On a sheet of its own; nothing when no number could be checked. */
export function NumbersCheckSheet({ posts, kit }: NumbersCheckProps) {
  if (posts.every((p) => p.checks.length === 0)) return null
  return <Sheet as="section" labelledBy="numbers-check"><SheetHead title="Numbers check" id="numbers-check" /><NumbersCheckList posts={posts} kit={kit} /></Sheet>
}

export function NumbersCheckList({ posts, kit }: NumbersCheckProps) {
  const rows = posts.flatMap(({ label, checks }) => checks.map((check) => ({ label, check })))
  if (rows.length === 0) return null
  return (
    <ul className="numbers-check">
      {rows.map(({ label, check }, i) => (
        <li key={i} className={check.verdict === 'conflicts' && check.role === 'advised' ? 'numbers-check-differs' : ''}>
          <span className="numbers-check-mark" aria-hidden="true">{marks[check.verdict]}</span>
          <span>
            <b>{[label, check.role === 'measured' ? 'measured' : ''].filter(Boolean).join(', ')}{label || check.role === 'measured' ? ' ' : ''}“{check.claim}”</b> {words[check.verdict]}{check.expected ? `: ${check.expected}` : ''}.
            {check.makerLimit ? <> <b>The kit maker’s own limit wins: {check.makerLimit}.</b></> : null}
            {check.role === 'measured' ? ' A measurement: charged to nobody.' : ''}
            <span className="block text-small text-ink-soft">{sourceWords(check)}{check.table ? <> <Link href={paths.shopTable(check.table, kit ? { kit } : {})}>Shop table</Link></> : null}</span>
          </span>
        </li>
      ))}
    </ul>
  )
}

function sourceWords({ source, basis }: NumbersCheckItem): string {
  return [source ? `${source.title}, ${source.section}` : '', basis ? (basisWords[basis] ?? '') : ''].filter(Boolean).join(' · ')
}
