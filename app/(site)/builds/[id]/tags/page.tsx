// Hold tags for paper: one, or all that are open, twelve on a page.
import type { Metadata } from 'next'
import { headers } from 'next/headers'
import { HoldTag } from '@/components/builds/hold-tag'
import { PageTitle } from '@/components/layout/page-title'
import { PlansWin } from '@/components/layout/plans-win'
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { PrintButton } from '@/components/ui/print-button'
import { formatDate } from '@/lib/format/date'
import { orNotFound } from '@/lib/http/or-not-found'
import { ownOrigin } from '@/lib/http/own-origin'
import { paths } from '@/lib/paths'
import { getHoldTags } from '@/lib/services/builds/get-hold-tags'
import { ownContext } from '../../own-context'

export const metadata: Metadata = { title: 'Hold tags' }

export default async function HoldTagsPage({ params, searchParams }: PageProps<'/builds/[id]/tags'>) {
  const context = await ownContext()
  const { hold } = await searchParams
  const holdId = typeof hold === 'string' && /^[1-9][0-9]{0,14}$/.test(hold) ? Number(hold) : hold === undefined ? null : 0
  const origin = ownOrigin(await headers())
  const { build, kit, tags } = await orNotFound((await params).id, (id) => getHoldTags(context, id, holdId, origin))
  return (
    <div className="tag-page page-body">
      <div className="button-row no-print"><PrintButton /><LinkButton href={paths.build(build.id)}>Back to the build</LinkButton></div>
      <PageTitle title="Hold tags" kicker={`${build.name} · ${kit.name} · printed ${formatDate(context.now)}`} lead="Cut, punch, tie on. The code opens the hold; to anybody but you it says only that they must not go past." />
      {tags.length === 0 ? <EmptyState title="Nothing is held" action={<LinkButton href={paths.build(build.id)}>Back to the build</LinkButton>}>A tag is printed while its hold is open.</EmptyState> : (
        <div className={tags.length === 1 ? 'tag-sheet tag-sheet-one' : 'tag-sheet'}>{tags.map((tag) => <HoldTag key={tag.hold.id} {...tag} name={context.actor?.name ?? ''} />)}</div>
      )}
      <div className="print-only"><PlansWin maker={kit.maker} /></div>
    </div>
  )
}
