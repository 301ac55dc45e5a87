// Keeps what is being written on this device, for this member and this form, and brings it back.
import { useCallback, useEffect, useRef, useState, type RefObject } from 'react'
import { formValues, type FormValues } from './form-values'

interface Kept { savedAt: number; values: FormValues }
const saveAfterMs = 400

/** `restored` is what was kept; `generation` changes when fields have to be drawn again from it. */
export function useDraft(form: RefObject<HTMLFormElement | null>, key: string, isRefused: boolean) {
  const [restored, setRestored] = useState<Kept | null>(null)
  const [generation, setGeneration] = useState(0)
  const isSent = useRef(false)
  const refused = useRef(isRefused)

  useEffect(() => {
    refused.current = isRefused
    if (isRefused) isSent.current = false
  }, [isRefused])

  useEffect(() => {
    const kept = readKept(key)
    if (kept) {
      setRestored(kept)
      setGeneration((n) => n + 1)
    }
    // A form that was sent and went away without a refusal was accepted: its draft has done its work.
    return () => { if (isSent.current && !refused.current) localStorage.removeItem(key) }
  }, [key])

  useEffect(() => {
    const element = form.current
    if (!element) return
    let timer: ReturnType<typeof setTimeout> | undefined
    const save = () => keep(key, { savedAt: Date.now(), values: formValues(element) })
    const onInput = () => { clearTimeout(timer); timer = setTimeout(save, saveAfterMs) }
    const onSubmit = () => { clearTimeout(timer); save(); isSent.current = true }
    element.addEventListener('input', onInput)
    element.addEventListener('submit', onSubmit)
    return () => {
      clearTimeout(timer)
      element.removeEventListener('input', onInput)
      element.removeEventListener('submit', onSubmit)
    }
  }, [form, key, generation])

  const throwAway = useCallback(() => {
    localStorage.removeItem(key)
    setRestored(null)
    setGeneration((n) => n + 1)
  }, [key])
  return { restored, generation, throwAway }
}

function readKept(key: string): Kept | null {
  try {
    const kept = JSON.parse(localStorage.getItem(key) ?? 'null') as Kept | null
    return kept && typeof kept.savedAt === 'number' && typeof kept.values === 'object' ? kept : null
  } catch {
    return null
  }
}

/** A device without room or without storage keeps no draft; writing goes on. */
function keep(key: string, kept: Kept): void {
  try {
    localStorage.setItem(key, JSON.stringify(kept))
  } catch {
    return
  }
}
