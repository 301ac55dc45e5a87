'use client'
// Day shift, night shift, or as the system says. The choice is kept in a cookie, so that the server draws the right one at once.
import { useState } from 'react'

export type Shift = 'day' | 'night' | 'system'

const choices: readonly { readonly shift: Shift, readonly label: string }[] = [
  { shift: 'day', label: 'Day' },
  { shift: 'night', label: 'Night' },
  { shift: 'system', label: 'As the system' },
]
const yearSeconds = 31_536_000

function keep(shift: Shift): void {
  const age = shift === 'system' ? 0 : yearSeconds
  document.cookie = `shift=${shift}; path=/; max-age=${age}; samesite=lax`
  if (shift === 'system') delete document.documentElement.dataset['shift']
  else document.documentElement.dataset['shift'] = shift
}

/** `initial` is what the server read from the cookie `shift`. */
export function ShiftSwitch({ initial }: { initial: Shift }) {
  const [shift, setShift] = useState(initial)
  return (
    <div className="page-switch shift-switch">
      <span className="label" id="shift-label">Shift</span>
      <div className="page-switch-row" role="group" aria-labelledby="shift-label">
        {choices.map((choice) => (
          <button key={choice.shift} type="button" aria-pressed={choice.shift === shift} onClick={() => { keep(choice.shift); setShift(choice.shift) }}>{choice.label}</button>
        ))}
      </div>
    </div>
  )
}
