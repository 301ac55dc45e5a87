'use client'
// Four buttons side by side: where the work on a section stands. The present one is pressed; a tap on another sets it.
import { ErrorSummary } from '@/components/ui/error-summary'
import { useForm, type FormAction } from '@/components/ui/use-form'
import { sectionStates, stateWords } from '@/lib/format/build-words'
import type { SectionState } from '@/lib/schemas/builds'

export interface SectionStateFormProps { action: FormAction; buildId: number; section: string; state: SectionState }

export function SectionStateForm({ action, buildId, section, state: present }: SectionStateFormProps) {
  const { state, submit, isPending, form } = useForm(action)
  return (
    <form ref={form} action={submit} className="grid gap-2">
      <ErrorSummary errors={state.message ? [{ message: state.message }] : []} />
      <input type="hidden" name="buildId" value={buildId} />
      <input type="hidden" name="section" value={section} />
      <div className="state-choice" role="group" aria-label={`State of ${section}`}>
        {sectionStates.map((name) => (
          <button key={name} type="submit" name="state" value={name} aria-pressed={name === present} disabled={isPending}>{stateWords[name]}</button>
        ))}
      </div>
    </form>
  )
}
