'use client'
// The button of a filter form: without JavaScript it is there to press; with it, every change goes at once and it steps aside.
import { useEffect } from 'react'
import { Button } from '@/components/ui/button'

export function AutoSubmit({ formId, label }: { formId: string; label: string }) {
  useEffect(() => {
    const form = document.getElementById(formId)
    if (!(form instanceof HTMLFormElement)) return
    const send = () => form.requestSubmit()
    form.addEventListener('change', send)
    return () => form.removeEventListener('change', send)
  }, [formId])
  return <Button type="submit" className="without-script">{label}</Button>
}
