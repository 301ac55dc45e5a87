'use client'
// Pressing a stamp: what makes the mentor sure, with the fields each basis needs, and the button on the empty place. Plain radios and
// fields: where the style sheet can tell, only the chosen basis shows its fields; elsewhere all of them do.
import type { ReactNode } from 'react'
import { useForm, type FormAction } from '@/components/ui/use-form'
import { Button } from '@/components/ui/button'
import { Checkbox } from '@/components/ui/checkbox'
import { ErrorSummary } from '@/components/ui/error-summary'
import { FieldError } from '@/components/ui/field'
import { ChoiceGroup, RadioRow } from '@/components/ui/radio-row'
import { TextArea } from '@/components/ui/text-area'
import { TextField } from '@/components/ui/text-field'
import type { Missing } from '@/lib/domain/stamps/stamp-state'
import { EmptyStamp } from './empty-stamp'

export interface StampFormProps {
  action: FormAction
  postId: number
  /** The letter that was read. */
  revision: string
  missing: Missing
  submission: string
  /** Page and step the question names, to start from. The revision is never filled in: the mentor reads it off the page. */
  plans?: { readonly page: string, readonly step?: string | undefined } | undefined
  /** A path of this site to go on to, such as the next tag; the post itself when absent. */
  returnTo?: string | undefined
  /** The post needs one stamp only. */
  single?: boolean
  /** Advised numbers that no listed source allows: the stamp then needs a written reason. */
  conflicts?: readonly { readonly claim: string; readonly expected?: string | undefined }[]
}

/** What was typed before a refusal, and what was wrong with it. */
type Typed = Pick<ReturnType<typeof useForm>, 'errorOf' | 'valueOf'>
interface Own { name: string; label: string; help?: string; type?: string; start?: string; className?: string; maxLength?: number }

function OwnField({ typed, prefix, name, label, help, type = 'text', start = '', className = '', maxLength = 120 }: Own & { typed: Typed; prefix: string }) {
  return (
    <div className={className}>
      <TextField id={`${prefix}-${name}`} name={name} label={label} type={type} maxLength={maxLength} autoComplete="off" defaultValue={typed.valueOf(name, start)} error={typed.errorOf(name)} {...(help ? { help } : {})} />
    </div>
  )
}

/** One basis: its radio, and under it the fields it needs. */
function Basis({ typed, value, label, help, children }: { typed: Typed; value: string; label: string; help: string; children: ReactNode }) {
  return (
    <div className="group/basis grid gap-2">
      <RadioRow name="basis" value={value} label={label} help={help} defaultChecked={typed.valueOf('basis') === value} />
      <div className="flex flex-wrap items-end gap-3 pb-3 pl-4 group-not-has-[[name=basis]:checked]/basis:hidden">{children}</div>
    </div>
  )
}

function Bases({ typed, prefix, plans }: { typed: Typed; prefix: string; plans: StampFormProps['plans'] }) {
  const own = { typed, prefix }
  return (
    <>
      <Basis typed={typed} value="plans" label="Plans step" help="page and revision before me">
        <OwnField {...own} name="page" label="Page" start={plans?.page ?? ''} className="w-32" maxLength={40} />
        <OwnField {...own} name="plansRevision" label="Rev" className="w-20" maxLength={20} />
        <OwnField {...own} name="step" label="Step" start={plans?.step ?? ''} className="w-24" maxLength={20} />
        <div className="basis-full">
          <FieldError id={`${prefix}-beforeMe`} error={typed.errorOf('beforeMe')} />
          <Checkbox id={`${prefix}-beforeMe`} name="beforeMe" value="yes" label="I have this page before me" defaultChecked={typed.valueOf('beforeMe') === 'yes'} aria-describedby={typed.errorOf('beforeMe') ? `${prefix}-beforeMe-error` : undefined} />
        </div>
      </Basis>
      <Basis typed={typed} value="standard" label="Published standard" help="edition, paragraph">
        <OwnField {...own} name="edition" label="Standard and edition" className="min-w-56 flex-1" />
        <OwnField {...own} name="paragraph" label="Paragraph" className="w-32" maxLength={60} />
      </Basis>
      <Basis typed={typed} value="own-build" label="Done on own build" help="which, and when">
        <OwnField {...own} name="build" label="Which build" className="min-w-56 flex-1" />
        <OwnField {...own} name="builtWhen" label="When" className="w-40" maxLength={60} />
      </Basis>
      <Basis typed={typed} value="maker-reply" label="Kit maker’s written reply" help="bulletin, all kits">
        <OwnField {...own} name="replyDate" label="Day of the reply" type="date" className="w-48" />
        <div className="basis-full">
          <ChoiceGroup id={`${prefix}-scope`} legend="It holds for" error={typed.errorOf('scope')}>
            <RadioRow name="scope" value="bulletin" label="Bulletin" help="everybody it names" defaultChecked={typed.valueOf('scope') === 'bulletin'} />
            <RadioRow name="scope" value="all-kits" label="All kits" help="said in general" defaultChecked={typed.valueOf('scope') === 'all-kits'} />
          </ChoiceGroup>
        </div>
      </Basis>
    </>
  )
}

export function StampForm({ action, postId, revision, missing, submission, plans, returnTo, single = false, conflicts = [] }: StampFormProps) {
  const { state, submit, isPending, form, errorOf, valueOf } = useForm(action)
  const prefix = `stamp-${postId}`
  const errors = state.errors.length > 0 ? state.errors.map((e) => ({ id: `${prefix}-${e.path}`, message: e.message })) : state.message ? [{ message: state.message }] : []
  return (
    <form ref={form} action={submit} noValidate className="grid gap-4">
      <ErrorSummary errors={errors} />
      <input type="hidden" name="postId" value={postId} />
      <input type="hidden" name="revision" value={revision} />
      <input type="hidden" name="submission" value={submission} />
      {returnTo ? <input type="hidden" name="returnTo" value={returnTo} /> : null}
      <div className="flex flex-wrap items-start gap-6">
        <div className="min-w-0 flex-[1_1_22rem]">
          <ChoiceGroup id={`${prefix}-basis`} legend="Basis: what makes you sure?" error={errorOf('basis')}>
            <Bases typed={{ errorOf, valueOf }} prefix={prefix} plans={plans} />
          </ChoiceGroup>
          {conflicts.length > 0 ? (
            <TextArea id={`${prefix}-conflictReason`} name="conflictReason" label="Why it is right all the same" rows={3} maxLength={1000} defaultValue={valueOf('conflictReason')} error={errorOf('conflictReason')}
              help={`Differs from the shop table: ${conflicts.map((c) => `“${c.claim}”${c.expected ? ` (${c.expected})` : ''}`).join('; ')}. Your reason is shown with the stamp.`} />
          ) : null}
        </div>
        <div className="grid justify-items-center gap-3">
          <EmptyStamp which={single && missing === 'first' ? 'only' : (missing ?? 'only')} />
          <Button type="submit" look="primary" disabled={isPending}>Press stamp on Rev {revision}</Button>
          <p className="max-w-44 text-center text-small text-ink-soft">Advice checked, work not inspected.</p>
        </div>
      </div>
    </form>
  )
}
