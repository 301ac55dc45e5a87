// My build: a member's own aeroplanes, and the form to begin another.
import type { Metadata } from 'next'
import type { Route } from 'next'
import Link from 'next/link'
import { randomUUID } from 'node:crypto'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { FieldsForm } from '@/components/ui/fields-form'
import { memberContext } from '@/lib/auth/guards'
import { countedHolds } from '@/lib/format/build-words'
import { formatHours } from '@/lib/format/hours'
import type { BuildSummary } from '@/lib/schemas/builds'
import { listBuilds } from '@/lib/services/builds/list-builds'
import { listKits } from '@/lib/services/kits/list-kits'
import { makeBuildAction } from './actions'

export const metadata: Metadata = { title: 'My build' }

export default async function BuildsPage() {
  const context = await memberContext()
  const [builds, { items: kits }] = await Promise.all([listBuilds(context), listKits(context)])
  return (
    <>
      <PageTitle title="My build" lead="Sections, hours, holds. Nobody sees it but you, whatever their role; a mentor or an inspector only by a link that you make." />
      {builds.length > 0 ? <ul className="sheet divide-y divide-line">{builds.map((build) => <BuildRow key={build.id} build={build} />)}</ul> : null}
      <section className="grid gap-4" aria-labelledby="new-build">
        <RivetLine title={builds.length > 0 ? 'Another aeroplane' : 'Your aeroplane'} id="new-build" />
        <FieldsForm action={makeBuildAction} id="build" button="Keep this build" look={builds.length > 0 ? 'plain' : 'primary'} hidden={{ submission: randomUUID() }} fields={[
          { name: 'kit', label: 'Kit', kind: 'select', options: kits.map((k) => ({ value: k.slug, label: k.name })) },
          { name: 'name', label: 'Name', maxLength: 80, autoComplete: 'off', help: 'Its registration, or what you call it.' },
          { name: 'serial', label: 'Serial of the kit', maxLength: 40, autoComplete: 'off', optional: true, help: 'Stays with you: it is shown to nobody else, not on a visit sheet either.' },
        ]} />
      </section>
    </>
  )
}

function BuildRow({ build }: { build: BuildSummary }) {
  const { states } = build
  const facts = [`${states.done} done`, `${states['in-work']} in work`, states.waiting > 0 ? `${states.waiting} waiting` : '', formatHours(build.minutes), build.openHolds > 0 ? countedHolds(build.openHolds) : '']
  return (
    <li className="grid gap-1 px-5 py-4">
      <p className="label">{build.kit.name}{build.serial ? ` · serial ${build.serial}` : ''}</p>
      <h2><Link className="link-sign tap" href={build.url as Route}>{build.name}</Link></h2>
      <p>{facts.filter(Boolean).join(' · ')}</p>
    </li>
  )
}
