// Keeps what is being written on this device, for this member and this form, and brings it back.
import { useCallback, useEffect, useRef, useSyncExternalStore, type RefObject } from 'react'
import type { FormState } from '@/lib/form-state'
import { formValues, type FormValues } from './form-values'

interface Kept { savedAt: number; values: FormValues }
const saveAfterMs = 400

/** `restored` is what was kept when the form came up; fields are drawn again from it under the key `generation`. */
export function useDraft(form: RefObject<HTMLFormElement | null>, key: string, state: FormState) {
  const restored = useSyncExternalStore(subscribe, () => keptAtFirst(key), () => null)
  /** The address the form was sent from; null when it was not sent, or came back refused. */
  const sentFrom = useRef<string | null>(null)

  useEffect(() => {
    sentFrom.current = null
  }, [state])

  useEffect(() => () => {
    // Sent and then led on to another address: it was posted, and the draft has done its work. A form that went away any other
    // way, such as into the error page when the connection is gone, keeps its draft.
    if (sentFrom.current !== null && sentFrom.current !== location.href) localStorage.removeItem(key)
    atFirst.delete(key)
  }, [key])

  useEffect(() => {
    const element = form.current
    if (!element) return
    let timer: ReturnType<typeof setTimeout> | undefined
    const save = () => keep(key, { savedAt: Date.now(), values: formValues(element) })
    const onInput = () => { clearTimeout(timer); timer = setTimeout(save, saveAfterMs) }
    const onSubmit = () => { clearTimeout(timer); save(); sentFrom.current = location.href }
    element.addEventListener('input', onInput)
    element.addEventListener('submit', onSubmit)
    return () => {
      clearTimeout(timer)
      element.removeEventListener('input', onInput)
      element.removeEventListener('submit', onSubmit)
    }
  }, [form, key])

  const throwAway = useCallback(() => {
    localStorage.removeItem(key)
    atFirst.set(key, null)
    for (const listener of listeners) listener()
  }, [key])
  return { restored, generation: restored?.savedAt ?? 0, throwAway }
}

// What storage held when a form came up. Later saves must not draw the fields again under the writer's hands.
const atFirst = new Map<string, Kept | null>()
const listeners = new Set<() => void>()

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

function keptAtFirst(key: string): Kept | null {
  const known = atFirst.get(key)
  if (known !== undefined) return known
  const kept = readKept(key)
  atFirst.set(key, kept)
  return kept
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
