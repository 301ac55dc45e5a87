// What the code on a hold's tag opens: the hold and its release for its owner; for everybody else only that they must not go past.
import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { PageTitle } from '@/components/layout/page-title'
import { LinkButton } from '@/components/ui/link-button'
import { AppError } from '@/lib/errors'
import { paths } from '@/lib/paths'
import { openHold, type OpenedHold } from '@/lib/services/builds/open-hold'
import { HoldWithRelease } from '../../builds/[id]/_components/hold-with-release'
import { ownContext } from '../../builds/own-context'

export const metadata: Metadata = { title: 'Hold', robots: { index: false } }

export default async function HoldPage({ params }: PageProps<'/holds/[code]'>) {
  const context = await ownContext()
  const { code } = await params
  const opened = await openHold(context, code).catch((error: unknown): OpenedHold => {
    if (error instanceof AppError && error.code === 'not-found') notFound()
    throw error
  })
  if (opened === 'somebody’s') return <Somebodys code={code} isVisitor={context.actor === null} />
  const { hold, build } = opened
  return (
    <>
      <PageTitle kicker={`${build.name} · ${build.kit}`} title={hold.released ? 'Released' : hold.kind === 'hold' ? 'Do not go past this step' : 'Left open on purpose'}
        aside={<LinkButton href={paths.buildSection(build.id, hold.section.code)}>{hold.section.code} {hold.section.title}</LinkButton>} />
      <div className="max-w-2xl"><HoldWithRelease hold={hold} withSection level={2} returnTo={hold.url} open /></div>
    </>
  )
}

/** Not a word of whose it is or what is held: the tag itself says that to whoever stands before it. */
function Somebodys({ code, isVisitor }: { code: string; isVisitor: boolean }) {
  return (
    <>
      <PageTitle kicker="Hold" title="Do not go past this step" lead="This is a hold of somebody’s build. Ask the builder." />
      {isVisitor ? <p><LinkButton href={paths.signIn(paths.hold(code))}>It is mine: sign in</LinkButton></p> : null}
    </>
  )
}
