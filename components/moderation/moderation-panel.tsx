// What a moderator does to one post: add a caution, waive one, hide or restore the post. Each with a reason that stays on record.
import { FieldsForm, type FieldsFormProps, type FormField } from '@/components/ui/fields-form'
import type { Caution, Post } from '@/lib/schemas/post'

type FormAction = FieldsFormProps['action']
/** A title never stands without its worst caution. */
export interface Duplicate { id: number; title: string; caution: { signalWord: string; title: string } | null }
export interface ModerationPanelProps {
  postId: number
  state: Post['state']
  cautions: readonly Pick<Caution, 'code' | 'title' | 'signalWord' | 'because' | 'waived'>[]
  allCautions: readonly { code: string; title: string }[]
  /** Entries of the same kind that may say the same; empty for an answer, and for a question whose answers would be lost. */
  duplicates: readonly Duplicate[]
  addCautionAction: FormAction
  waiveCautionAction: FormAction
  setStateAction: FormAction
  mergeAction: FormAction
}

const reasonField = (label: string, help?: string): FormField => ({ name: 'reason', label, kind: 'area', maxLength: 1000, ...(help ? { help } : {}) })

export function ModerationPanel({ postId, state, cautions, allCautions, duplicates, addCautionAction, waiveCautionAction, setStateAction, mergeAction }: ModerationPanelProps) {
  const standing = cautions.filter((c) => !c.waived)
  const missing = allCautions.filter((all) => !standing.some((c) => c.code === all.code))
  const isOpen = state === 'visible'
  return (
    <div className="grid gap-8">
      {missing.length > 0 ? (
        <section className="grid gap-3">
          <h3 className="label">Add a caution</h3>
          <FieldsForm action={addCautionAction} id={`add-caution-${postId}`} hidden={{ postId }} button="Add the caution" fields={[
            { name: 'code', label: 'Caution', kind: 'select', value: '', options: [{ value: '', label: 'Choose one' }, ...missing.map((c) => ({ value: c.code, label: c.title }))] },
            { name: 'because', label: 'Why', maxLength: 200, help: 'In a few words, such as: the text speaks of a fuel line. On a question it goes onto its answers too.' },
          ]} />
        </section>
      ) : null}
      {standing.length > 0 ? (
        <section className="grid gap-3">
          <h3 className="label">Waive a caution</h3>
          <FieldsForm action={waiveCautionAction} id={`waive-caution-${postId}`} hidden={{ postId }} button="Waive it on this post" fields={[
            { name: 'code', label: 'Caution', kind: 'select', value: '', options: [{ value: '', label: 'Choose one' }, ...standing.map((c) => ({ value: c.code, label: `${c.signalWord} ${c.title} (${c.because})` }))] },
            reasonField('Why it does not apply here', 'Name and reason stay on record; readers see the reason.'),
          ]} />
        </section>
      ) : null}
      {isOpen && duplicates.length > 0 ? (
        <section className="grid gap-3">
          <h3 className="label">Merge a duplicate</h3>
          <FieldsForm action={mergeAction} id={`merge-${postId}`} hidden={{ postId }} button="Merge it" fields={[
            { name: 'into', label: 'Into which entry', kind: 'select', value: '', options: [{ value: '', label: 'Choose one' }, ...duplicates.map((d) => ({ value: String(d.id), label: `${d.caution ? `${d.caution.signalWord} ${d.caution.title}: ` : ''}${d.title} (${d.id})` }))] },
            reasonField('Why', 'Its address will lead to the other entry. Nothing is deleted, and it can be restored.'),
          ]} />
        </section>
      ) : null}
      {isOpen || state === 'hidden' || state === 'merged' ? (
        <section className="grid gap-3">
          <h3 className="label">{isOpen ? 'Hide the post' : 'Restore the post'}</h3>
          <FieldsForm action={setStateAction} id={`state-${postId}`} hidden={{ postId, state: isOpen ? 'hidden' : 'visible' }} button={isOpen ? 'Hide it' : 'Restore it'}
            fields={[reasonField('Why', isOpen ? 'Nothing is deleted: its author and moderators still see it, with this reason.' : undefined)]} />
        </section>
      ) : null}
    </div>
  )
}
