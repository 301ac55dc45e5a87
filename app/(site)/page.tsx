// The first page: the search line is the door; below it what was checked lately and what is still open.
import { HitList, HitPlate } from '@/components/entries/hit-list'
import { PageTitle } from '@/components/layout/page-title'
import { RivetLine } from '@/components/layout/rivet-line'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { pageContext } from '@/lib/auth/guards'
import { paths } from '@/lib/paths'
import { getHome } from '@/lib/services/home/get-home'

export default async function HomePage() {
  const { stamped, open } = await getHome(await pageContext())
  return (
    <>
      <PageTitle title="Know before you drill" lead="Look it up in the line above: a part, a task, a size. Nothing found? Ask. Section finished? Write down what you would do differently."
        aside={<div className="button-row"><LinkButton href={paths.ask()} look="primary">Ask</LinkButton><LinkButton href={paths.lesson()}>Write a lesson</LinkButton></div>} />
      <HitPlate hits={[...stamped, ...open]} />
      <RivetLine title="Stamped lately" />
      {stamped.length > 0 ? <HitList hits={stamped} /> : <EmptyState title="No stamps yet" level={2}>Mentors stamp answers and lessons once they have checked them.</EmptyState>}
      <RivetLine title="Open questions" />
      {open.length > 0 ? <HitList hits={open} actionFor={(hit) => <LinkButton href={`${paths.entry(hit.id)}#say` as ReturnType<typeof paths.entry>}>Say what to do</LinkButton>} />
        : <EmptyState title="Every question has an answer" action={<LinkButton href={paths.ask()} look="primary">Ask one</LinkButton>} />}
    </>
  )
}
