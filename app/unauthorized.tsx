// Shown where a sign-in is needed.
import { EmptyState } from '@/components/ui/empty-state'
import { LinkButton } from '@/components/ui/link-button'
import { paths } from '@/lib/paths'

export default function Unauthorized() {
  return <EmptyState level={1} title="Sign in first" action={<><LinkButton href={paths.signIn()} look="primary">Sign in</LinkButton><LinkButton href={paths.signUp()}>Sign up</LinkButton></>}><p>This page is for members. What you read and search stays open if your group allows it.</p></EmptyState>
}
