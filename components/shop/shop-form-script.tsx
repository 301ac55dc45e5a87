'use client'
// Makes the form of a shop table answer at once: a change sends it. When the address changes (also by Back), the fields follow it.
import { useEffect } from 'react'
import { useSubmitOnChange } from '@/lib/client/use-submit-on-change'

/** `values`: what the address says, by field name. */
export function ShopFormScript({ formId, values }: { formId: string; values: Readonly<Record<string, string>> }) {
  useSubmitOnChange(formId)
  useEffect(() => {
    const form = document.getElementById(formId)
    if (!(form instanceof HTMLFormElement)) return
    for (const field of form.elements) {
      const isField = field instanceof HTMLInputElement || field instanceof HTMLSelectElement
      // Whatever is being typed right now stays.
      if (isField && field.name in values && field !== document.activeElement) field.value = values[field.name] ?? ''
    }
  }, [formId, values])
  return null
}
