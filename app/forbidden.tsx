// Shown where a right is missing: what it means, and the next step.
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { paths } from '@/lib/paths'

export default function Page() {
  return <EmptyState level={1} title="Not allowed" action={<><LinkButton href={paths.search()} look="primary">Search</LinkButton><LinkButton href={paths.home}>First page</LinkButton></>}><p>You are signed in, but this needs a right you do not have. A steward of your group gives rights.</p></EmptyState>
}
