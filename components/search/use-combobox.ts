// The keys and states of an editable combobox with a list, as the ARIA Authoring Practices give them, on a field that was there before:
// it works as a plain field until this is loaded. What the list looks like is the caller's.
import { useEffect, useState, type RefObject } from 'react'

interface Combobox {
  input: RefObject<HTMLInputElement | null>
  listId: string
  /** Where the list stands; going there with the focus does not close it. */
  popupId: string
  options: readonly { readonly id: string }[]
  isOpen: boolean
  open: () => void
  close: () => void
  choose: (index: number) => void
}

/** The option the keys are on, or null. */
export function useCombobox({ input, listId, popupId, options, isOpen, open, close, choose }: Combobox): string | null {
  const [activeId, setActiveId] = useState<string | null>(null)
  // An option that went away with new results is no longer the one the keys are on.
  const active = isOpen ? options.findIndex(({ id }) => id === activeId) : -1
  const shownId = options[active]?.id ?? null
  useEffect(() => {
    const field = input.current
    if (!field) return
    const onKey = (event: KeyboardEvent) => {
      if (event.isComposing || event.ctrlKey || event.metaKey) return
      const act = keyActs({ event, active, count: options.length, isOpen })
      if (!act) return
      if (act.stays) event.preventDefault()
      if (act.list === 'open') open()
      if (act.list === 'close') close()
      if (act.chosen !== undefined) choose(act.chosen)
      if (act.active !== undefined) setActiveId(options[act.active]?.id ?? null)
    }
    const onInput = () => { setActiveId(null); open() }
    const onBlur = (event: FocusEvent) => {
      const next = event.relatedTarget
      if (!(next instanceof Element) || !next.closest(`#${popupId}`)) close()
    }
    field.addEventListener('keydown', onKey)
    field.addEventListener('input', onInput)
    field.addEventListener('blur', onBlur)
    return () => {
      field.removeEventListener('keydown', onKey)
      field.removeEventListener('input', onInput)
      field.removeEventListener('blur', onBlur)
    }
  }, [input, popupId, options, active, isOpen, open, close, choose])
  useStates(input, { listId, isExpanded: isOpen && options.length > 0, activeId: shownId })
  return shownId
}

interface Pressed { event: KeyboardEvent; active: number; count: number; isOpen: boolean }
interface Act { stays?: true; list?: 'open' | 'close'; active?: number; chosen?: number }

/** What a key does: Down and Up go round; Home, End, Left and Right go back to the text; Escape closes, and clears only when closed. */
function keyActs({ event: { key, altKey }, active, count, isOpen }: Pressed): Act | null {
  switch (key) {
    case 'ArrowDown':
      if (altKey || count === 0) return { stays: true, list: 'open' }
      return { stays: true, list: 'open', active: (active + 1) % count }
    case 'ArrowUp':
      if (altKey) return { stays: true, list: 'close', active: -1 }
      return count === 0 ? null : { stays: true, list: 'open', active: active <= 0 ? count - 1 : active - 1 }
    case 'Enter': return isOpen && active >= 0 ? { stays: true, list: 'close', chosen: active, active: -1 } : null
    case 'Escape': return isOpen ? { stays: true, list: 'close', active: -1 } : null
    case 'Home': case 'End': case 'ArrowLeft': case 'ArrowRight': return active >= 0 ? { active: -1 } : null
    default: return null
  }
}

/** The attributes live on the field; `aria-controls` names the list only while it stands there. */
function useStates(input: Combobox['input'], { listId, isExpanded, activeId }: { listId: string; isExpanded: boolean; activeId: string | null }): void {
  useEffect(() => {
    const field = input.current
    if (!field) return
    const states = { role: 'combobox', 'aria-autocomplete': 'list', 'aria-haspopup': 'listbox', 'aria-expanded': String(isExpanded), 'aria-controls': isExpanded ? listId : null, 'aria-activedescendant': activeId }
    for (const [name, value] of Object.entries(states)) {
      if (value === null) field.removeAttribute(name)
      else field.setAttribute(name, value)
    }
    if (activeId) document.getElementById(activeId)?.scrollIntoView({ block: 'nearest' })
  }, [input, listId, isExpanded, activeId])
}
