// Sign out: a form of its own, since a link must not change anything.
import { Button, type ButtonLook } from '@/components/ui/button'

export function SignOutForm({ action, look = 'plain' }: { action: (form: FormData) => Promise<void>; look?: ButtonLook }) {
  return <form action={action}><Button type="submit" look={look}>Sign out</Button></form>
}
