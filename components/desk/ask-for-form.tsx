'use client'
// "Or ask for": one of four things that are missing before a stamp. Pressed, the tag leaves the rail until its author answers.
import { useForm, type FormAction } from '@/components/ui/use-form'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { askForButtons } from './ask-for-words'

export interface AskForFormProps {
  action: FormAction
  postId: number
  /** A path of this site to go on to. */
  returnTo: string
  /** Asked for already, and not answered. */
  asked: readonly string[]
}

export function AskForForm({ action, postId, returnTo, asked }: AskForFormProps) {
  const { state, submit, isPending, form } = useForm(action)
  return (
    <form ref={form} action={submit} className="button-row" aria-label="Ask the author for">
      {state.message ? <ErrorSummary errors={[{ message: state.message }]} /> : null}
      <input type="hidden" name="postId" value={postId} />
      <input type="hidden" name="returnTo" value={returnTo} />
      <span className="label">Or ask for</span>
      {askForButtons.filter((b) => !asked.includes(b.what)).map((b) => <Button key={b.what} type="submit" name="what" value={b.what} small disabled={isPending}>{b.label}</Button>)}
    </form>
  )
}
