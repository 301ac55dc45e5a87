'use client'
// Sends a form at every change, also at one that was made before the page was awake: what stands in the fields is what is shown.
import { useEffect } from 'react'

/** `formId`: id of a form on the page. */
export function useSubmitOnChange(formId: string): void {
  useEffect(() => {
    const form = document.getElementById(formId)
    if (!(form instanceof HTMLFormElement)) return
    const send = () => form.requestSubmit()
    form.addEventListener('change', send)
    // A choice made meanwhile; words may still be being typed, and go with their own change.
    const field = document.activeElement
    if (field instanceof HTMLSelectElement && field.form === form && [...field.options].some((o) => o.selected !== o.defaultSelected)) send()
    return () => form.removeEventListener('change', send)
  }, [formId])
}
