// What may be changed about one member: role, suspension, mentorship. The page says which of them this reader may do.
import { FieldsForm, type FieldsFormProps, type FormField } from '@/components/ui/fields-form'
import type { Role } from '@/lib/policy/actor'
import { roleWords } from './role-words'

type FormAction = FieldsFormProps['action']

export interface CaredFor { id: number; name: string; role: Role; state: 'active' | 'suspended'; mark: string | null }

const reason = (label: string, help?: string): FormField => ({ name: 'reason', label, kind: 'area', maxLength: 1000, ...(help ? { help } : {}) })

export function RoleForm({ action, person }: { action: FormAction; person: CaredFor }) {
  return (
    <FieldsForm action={action} id={`role-${person.id}`} hidden={{ memberId: person.id }} button="Set the role" fields={[{
      name: 'role', label: 'Role', kind: 'select', value: person.role, options: (['member', 'moderator', 'steward'] as const).map((role) => ({ value: role, label: roleWords[role] })),
      help: 'Moderators set cautions, hide and suspend. Stewards also change people. It holds from the next page they open.',
    }]} />
  )
}

export function MemberStateForm({ action, person }: { action: FormAction; person: CaredFor }) {
  const isActive = person.state === 'active'
  return (
    <FieldsForm action={action} id={`state-${person.id}`} hidden={{ memberId: person.id, state: isActive ? 'suspended' : 'active' }} button={isActive ? 'Suspend' : 'Let them back in'}
      fields={[reason('Why', isActive ? 'They are out on their next request. What they wrote and stamped stands, and mentors look at their stamps again.' : undefined)]} />
  )
}

export function MentorshipForm({ grantAction, endAction, person }: { grantAction: FormAction; endAction: FormAction; person: CaredFor }) {
  if (person.mark !== null) {
    return (
      <FieldsForm action={endAction} id={`mentor-end-${person.id}`} hidden={{ memberId: person.id }} button={`End ${person.mark}`}
        fields={[reason('Why it ends', 'Stamps that were pressed stay, with their number. The number is not given again.')]} />
    )
  }
  return (
    <FieldsForm action={grantAction} id={`mentor-${person.id}`} hidden={{ memberId: person.id }} button="Grant mentorship" fields={[
      { name: 'number', label: 'Number on the stamp', maxLength: 6, placeholder: 'IC 042', autoComplete: 'off', help: 'Two capitals, a space and three digits. Never given twice.' },
      { name: 'fields', label: 'Fields', maxLength: 200, help: 'What they know, such as: primary structure, riveting, fuel tanks.' },
      reason('Why', 'What they have built or inspect, and how you know. It stays on record.'),
    ]} />
  )
}
