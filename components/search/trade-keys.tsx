'use client'
// The row of trade keys over a phone's keyboard while the search line has the focus: sizes, #, AN, dash and the words typed most.
// The style shows it to coarse pointers on narrow screens alone. Comes with the live results, so a page that is only read doesn't load it.
import { useEffect, useRef, type RefObject } from 'react'
import { SIZE_KEYS, typeTradeKey, WORD_KEYS, type TradeKey } from '@/lib/format/trade-key'

export function TradeKeys({ input }: { input: RefObject<HTMLInputElement | null> }) {
  const row = useRef<HTMLDivElement>(null)
  useEffect(() => followKeyboard(row.current), [])
  const press = (key: string) => {
    const field = input.current
    if (!field) return
    const typed = typeTradeKey(field.value, field.selectionStart ?? field.value.length, field.selectionEnd ?? field.value.length, key)
    field.focus()
    if (typed.value.length > field.maxLength) return
    field.setRangeText(typed.value, 0, field.value.length)
    field.setSelectionRange(typed.caret, typed.caret)
    field.dispatchEvent(new Event('input', { bubbles: true }))
  }
  return (
    <div className="trade-keys" role="group" aria-label="Trade keys" ref={row} onPointerDown={keepFocus} onMouseDown={keepFocus}>
      <div className="trade-sizes">{SIZE_KEYS.map((key) => <Key key={key.text} {...key} onPress={press} />)}</div>
      <div className="trade-words">{WORD_KEYS.map((key) => <Key key={key.text} {...key} onPress={press} />)}</div>
    </div>
  )
}

function Key({ text, name, onPress }: TradeKey & { onPress: (key: string) => void }) {
  return <button type="button" className="trade-key" aria-label={name} onClick={() => onPress(text)}>{text}</button>
}

/** A finger on a key must not take the focus from the line, or the keyboard would go. */
const keepFocus = (event: { preventDefault: () => void }) => event.preventDefault()

/** A phone lays its keyboard over the page without making the page shorter: the row has to be lifted by its height. */
function followKeyboard(row: HTMLElement | null): (() => void) | undefined {
  const seen = window.visualViewport
  if (!row || !seen) return undefined
  const form = row.closest('form') ?? row
  const lift = () => {
    form.style.setProperty('--keyboard', `${Math.max(0, Math.round(window.innerHeight - seen.height - seen.offsetTop))}px`)
  }
  lift()
  seen.addEventListener('resize', lift)
  seen.addEventListener('scroll', lift)
  return () => {
    seen.removeEventListener('resize', lift)
    seen.removeEventListener('scroll', lift)
  }
}
