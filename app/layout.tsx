// The house around every page: shift, units, fonts, header with the search line, footer, the bottom bar of a phone.
import './globals.css'
import type { Metadata, Viewport } from 'next'
import { cookies } from 'next/headers'
import type { ReactNode } from 'react'
import { BottomBar } from '@/components/layout/bottom-bar'
import { ConnectionBanner } from '@/components/layout/connection-banner'
import { ShiftSwitch } from '@/components/layout/shift-switch'
import { SiteFooter } from '@/components/layout/site-footer'
import { SiteHeader } from '@/components/layout/site-header'
import { UnitsChoiceSwitch } from '@/components/layout/units-choice-switch'
import { SearchLine } from '@/components/search/search-line'
import { currentActor } from '@/lib/auth/current-user'
import { readerUnits } from '@/lib/auth/reader-units'
import { fontClassNames } from '@/lib/fonts/fonts'
import { paths } from '@/lib/paths'
import { navigationFor } from './navigation'
import { keepUnitsAction } from './units-action'

export const metadata: Metadata = { title: { default: 'Pilothole: know before you drill', template: '%s · Pilothole' }, description: 'Answers and lessons of people who build all-metal kit aeroplanes, checked by mentors.' }
export const viewport: Viewport = { themeColor: [{ media: '(prefers-color-scheme: light)', color: '#E9ECEB' }, { media: '(prefers-color-scheme: dark)', color: '#121716' }] }

export default async function RootLayout({ children }: { children: ReactNode }) {
  const [jar, actor, units] = await Promise.all([cookies(), currentActor(), readerUnits()])
  const value = jar.get('shift')?.value
  const shift = value === 'day' || value === 'night' ? value : 'system'
  const { rooms, bar, footer } = navigationFor(actor)
  return (
    <html lang="en" className={fontClassNames} data-shift={shift === 'system' ? undefined : shift} data-units={units === 'written' ? undefined : units}>
      <body>
        <SiteHeader items={rooms} search={<SearchLine action={paths.search()} />} />
        <ConnectionBanner />
        <main id="content" tabIndex={-1} className="page page-body">{children}</main>
        <SiteFooter items={footer} end={<><UnitsChoiceSwitch action={keepUnitsAction} chosen={units} /><ShiftSwitch initial={shift} /></>} />
        <BottomBar items={bar} />
      </body>
    </html>
  )
}
