'use client'
// A short note under a post.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { TextArea } from '@/components/ui/text-area'
import { one } from '@/lib/client/form-values'
import { useDraft } from '@/lib/client/use-draft'
import { useForm, type FormAction } from '@/components/ui/use-form'

export function RemarkForm({ action, postId, submission, memberId }: { action: FormAction; postId: number; submission: string; memberId: number }) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const { restored, generation } = useDraft(form, `draft:${memberId}:remark-${postId}`, state)
  const id = `remark-${postId}`
  return (
    <form ref={form} action={submit} className="form-small">
      {state.message ? <ErrorSummary errors={[{ id, message: state.message }]} /> : null}
      <input type="hidden" name="postId" value={postId} />
      <input type="hidden" name="submission" value={submission} />
      <TextArea key={generation} id={id} name="body" label="Remark" rows={3} maxLength={2000} defaultValue={valueOf('body', restored ? one(restored.values, 'body') : '')} error={errorOf('body')} help="Short: a figure, a caution, a question back. Advice belongs in a row of its own." />
      <Button type="submit" disabled={isPending}>{isPending ? 'Sending' : 'Post the remark'}</Button>
    </form>
  )
}
