'use client'
// The button of a filter form: without JavaScript it is there to press; with it, every change goes at once and it steps aside.
import { Button } from '@/components/ui/button'
import { useSubmitOnChange } from '@/lib/client/use-submit-on-change'

export function AutoSubmit({ formId, label }: { formId: string; label: string }) {
  useSubmitOnChange(formId)
  return <Button type="submit" className="without-script">{label}</Button>
}
