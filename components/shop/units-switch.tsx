// Inch or metric first, as two links: the choice stands in the address, so that it works without JavaScript and goes with a kept link.
import Link from 'next/link'
import type { Route } from 'next'
import type { FirstSystem } from '@/lib/format/shop-words'

const labels: Readonly<Record<FirstSystem, string>> = { inch: 'Inch first', metric: 'mm first' }

export function UnitsSwitch({ first, hrefs }: { first: FirstSystem; hrefs: Readonly<Record<FirstSystem, Route>> }) {
  return (
    <nav className="units-switch no-print" aria-label="Units">
      {(['inch', 'metric'] as const).map((system) => <Link key={system} href={hrefs[system]} scroll={false} aria-current={system === first ? 'true' : undefined}>{labels[system]}</Link>)}
    </nav>
  )
}
