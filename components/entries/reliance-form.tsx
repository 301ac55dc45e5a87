'use client'
// "I'm going by this": one button, pressed before the act; pressed again it is taken off.
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { useForm, type FormAction } from '@/components/ui/use-form'

export function RelianceForm({ action, postId, revision, goesBy }: { action: FormAction; postId: number; revision: string; goesBy: string | null }) {
  const { state, submit, isPending, form } = useForm(action)
  const isOn = goesBy === revision
  return (
    <form ref={form} action={submit} className="form-inline">
      {state.message ? <ErrorSummary errors={[{ message: state.message }]} /> : null}
      <input type="hidden" name="postId" value={postId} />
      <input type="hidden" name="on" value={isOn ? '0' : '1'} />
      {isOn
        ? <><span className="going-by">You go by Rev {revision}</span><Button type="submit" look="quiet" disabled={isPending}>Not any more</Button></>
        : <Button type="submit" look="primary" disabled={isPending}>{goesBy ? `You went by Rev ${goesBy}: go by Rev ${revision}` : 'I’m going by this'}</Button>}
    </form>
  )
}
