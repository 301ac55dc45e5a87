'use client'
// What every small form shares: the action's state, errors by field, what was typed, and focus on the summary after a refusal.
import { useActionState, useEffect, useRef } from 'react'
import { emptyForm, type FormState } from '@/lib/form-state'

export type FormAction = (before: FormState, form: FormData) => Promise<FormState>

/** `errorOf('note')` is the message beside that field; `valueOf('note')` what was typed before a refusal. */
export function useForm(action: FormAction) {
  const [state, submit, isPending] = useActionState(action, emptyForm)
  const form = useRef<HTMLFormElement>(null)
  useEffect(() => {
    if (state.message) form.current?.querySelector<HTMLElement>('#error-summary')?.focus()
  }, [state])
  return {
    state, submit, isPending, form,
    errorOf: (path: string) => state.errors.find((e) => e.path === path || e.path.startsWith(`${path}.`))?.message,
    valueOf: (name: string, fallback = ''): string => { const v = state.values[name]; return typeof v === 'string' ? v : (v?.[0] ?? fallback) },
  }
}
