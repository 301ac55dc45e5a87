// A mentor takes their own stamp back: one reason, which stays readable on the stamp.
import { FieldsForm, type FieldsFormProps } from '@/components/ui/fields-form'

export function WithdrawStampForm({ action, stampId }: { action: FieldsFormProps['action']; stampId: number }) {
  return (
    <FieldsForm action={action} id={`withdraw-${stampId}`} hidden={{ stampId }} button="Withdraw my stamp"
      fields={[{ name: 'reason', label: 'Why it no longer stands', kind: 'area', maxLength: 1000, help: 'It stays readable across the stamp. Builders who go by this advice will read it.' }]} />
  )
}
