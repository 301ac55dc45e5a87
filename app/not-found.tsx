// Shown where nothing is: what it means, and the next step.
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { paths } from '@/lib/paths'

export default function Page() {
  return <EmptyState level={1} title="Nothing at this address" action={<><LinkButton href={paths.search()} look="primary">Search</LinkButton><LinkButton href={paths.home}>First page</LinkButton></>}><p>It may have been moved or mistyped. Nothing is ever deleted here by a click; a hidden post shows only to its author and moderators.</p></EmptyState>
}
