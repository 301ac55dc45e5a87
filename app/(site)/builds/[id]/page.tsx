// One aeroplane: sections in plan order with their state, what is held, what is left open on purpose, what its owner goes by.
import type { Metadata } from 'next'
import { ListPlate } from '@/components/cautions/list-plate'
import { GoneByList } from '@/components/builds/gone-by-list'
import { SectionRow } from '@/components/builds/section-row'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { LinkButton } from '@/components/ui/link-button'
import { formatHours } from '@/lib/format/hours'
import { orNotFound } from '@/lib/http/or-not-found'
import { paths } from '@/lib/paths'
import type { Build } from '@/lib/schemas/builds'
import { getBuild } from '@/lib/services/builds/get-build'
import { ownContext } from '../own-context'
import { setSectionStateAction } from '../actions'
import { HoldWithRelease } from './_components/hold-with-release'

export const metadata: Metadata = { title: 'My build' }

export default async function BuildPage({ params }: PageProps<'/builds/[id]'>) {
  const context = await ownContext()
  const build = await orNotFound((await params).id, (id) => getBuild(context, id))
  const held = build.holds.length + build.leftOpen.length
  return (
    <>
      <PageTitle kicker={`${build.kit.name}${build.serial ? ` · serial ${build.serial}` : ''}`} title={build.name}
        lead={`${formatHours(build.minutes)} so far. ${build.states.done} of ${build.sections.length} sections done, ${build.states['in-work']} in work.`}
        aside={held > 0 ? <LinkButton href={paths.holdTags(build.id)}>Print hold tags</LinkButton> : null} />
      <Held build={build} />
      <section className="grid gap-4" aria-labelledby="sections">
        <RivetLine title="Sections" id="sections" note="in plan order" />
        <ul className="sheet">{build.sections.map((row) => <SectionRow key={row.code} buildId={build.id} row={row} action={setSectionStateAction} />)}</ul>
      </section>
      {build.goingBy.length > 0 ? (
        <section className="grid gap-4" aria-labelledby="going-by">
          <RivetLine title="What I go by" id="going-by" />
          <ListPlate items={build.goingBy.map((g) => ({ id: g.postId, cautions: g.cautions }))} />
          <GoneByList items={build.goingBy} />
        </section>
      ) : null}
    </>
  )
}

function Held({ build }: { build: Build }) {
  return (
    <>
      {build.holds.length > 0 ? (
        <section className="grid gap-4" aria-labelledby="holds">
          <RivetLine title="Held" id="holds" />
          <div className="hold-cards">{build.holds.map((hold) => <HoldWithRelease key={hold.id} hold={hold} withSection />)}</div>
        </section>
      ) : null}
      {build.leftOpen.length > 0 ? (
        <section className="grid gap-4" aria-labelledby="left-open">
          <RivetLine title="Left open on purpose" id="left-open" />
          <div className="hold-cards">{build.leftOpen.map((hold) => <HoldWithRelease key={hold.id} hold={hold} withSection />)}</div>
        </section>
      ) : null}
    </>
  )
}
