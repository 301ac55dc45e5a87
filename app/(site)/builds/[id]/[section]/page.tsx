// One section of a member's own build: where the work stands, what is held, the log, what they go by, the closing list, visits.
import type { Metadata } from 'next'
import { ListPlate } from '@/components/cautions/list-plate'
import { ClosingLineForm } from '@/components/builds/closing-line-form'
import { ClosingList } from '@/components/builds/closing-list'
import { GoneByList } from '@/components/builds/gone-by-list'
import { SectionStateForm } from '@/components/builds/section-state-form'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { LinkButton } from '@/components/ui/link-button'
import { orNotFound } from '@/lib/http/or-not-found'
import { pathSegment } from '@/lib/http/path-segment'
import { paths } from '@/lib/paths'
import type { BuildSection } from '@/lib/schemas/builds'
import { getBuild } from '@/lib/services/builds/get-build'
import { getBuildSection } from '@/lib/services/builds/get-build-section'
import { listVisits } from '@/lib/services/builds/list-visits'
import { answerClosingItemAction, setSectionStateAction } from '../../actions'
import { ownContext } from '../../own-context'
import { HoldForms } from '../_components/hold-forms'
import { HoldWithRelease } from '../_components/hold-with-release'
import { SectionLog } from '../_components/section-log'
import { SectionVisits } from '../_components/section-visits'

export const metadata: Metadata = { title: 'My section' }

export default async function BuildSectionPage({ params, searchParams }: PageProps<'/builds/[id]/[section]'>) {
  const context = await ownContext()
  const { id: idInAddress, section: segment } = await params
  const { change } = await searchParams
  const code = pathSegment(segment) ?? ''
  const [section, build, visits] = await orNotFound(idInAddress, (id) => Promise.all([getBuildSection(context, id, code), getBuild(context, id), listVisits(context, id, code)]))
  return (
    <>
      <PageTitle kicker={`${section.build.name} · ${section.build.kit.name}`} title={`${section.code} ${section.title}`}
        aside={<div className="button-row"><LinkButton href={paths.section(section.build.kit.slug, section.code)}>What is known</LinkButton><LinkButton href={paths.build(section.build.id)} look="quiet">All sections</LinkButton></div>} />
      <SectionStateForm action={setSectionStateAction} buildId={section.build.id} section={section.code} state={section.state} />
      <Holds section={section} sections={build.sections} />
      <SectionLog section={section} change={typeof change === 'string' ? change : undefined} now={context.now} />
      <GoingBy section={section} />
      {section.closing.length > 0 ? (
        <section className="grid gap-4" aria-labelledby="closing">
          <RivetLine title="Closing list" id="closing" note="before this section is closed" />
          <ClosingList lines={section.closing} formOf={(line) => <ClosingLineForm action={answerClosingItemAction} buildId={section.build.id} itemId={line.id} text={line.text} note={line.answer?.note ?? ''} />} />
        </section>
      ) : null}
      <SectionVisits buildId={section.build.id} section={section.code} visits={visits} />
    </>
  )
}

function Holds({ section, sections }: { section: BuildSection; sections: readonly { code: string; title: string }[] }) {
  return (
    <section className="grid gap-4" aria-labelledby="holds">
      <RivetLine title="Holds" id="holds" />
      {section.openUntilHere.length > 0 ? (
        <>
          <p><b>Left open for this section:</b></p>
          <div className="hold-cards">{section.openUntilHere.map((hold) => <HoldWithRelease key={hold.id} hold={hold} withSection />)}</div>
        </>
      ) : null}
      {section.holds.length > 0 ? <div className="hold-cards">{section.holds.map((hold) => <HoldWithRelease key={hold.id} hold={hold} />)}</div> : null}
      <HoldForms buildId={section.build.id} section={section.code} sections={sections} />
    </section>
  )
}

function GoingBy({ section: { goingBy } }: { section: BuildSection }) {
  return (
    <section className="grid gap-4" aria-labelledby="going-by">
      <RivetLine title="What I go by" id="going-by" />
      {goingBy.length === 0 ? <p className="text-ink-soft">Nothing yet. Tap “I’m going by this” on advice about this section, and it stands here with its cautions.</p> : (
        <>
          <ListPlate items={goingBy.map((g) => ({ id: g.postId, cautions: g.cautions }))} />
          <GoneByList items={goingBy} />
        </>
      )}
    </section>
  )
}
