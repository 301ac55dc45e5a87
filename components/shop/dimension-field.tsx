'use client'
// The box on a dimension line: what is typed here goes into the form's own field, which sends it. It has no name, so that nothing is
// sent twice, and without JavaScript the figure shows the value as words instead.
import { useEffect, useRef } from 'react'

export interface DimensionFieldProps {
  /** The id of the form field that holds the value. */
  fieldId: string
  label: string
  value: string
  placeholder: string
}

export function DimensionField({ fieldId, label, value, placeholder }: DimensionFieldProps) {
  const box = useRef<HTMLInputElement>(null)
  useEffect(() => {
    if (box.current) box.current.value = value
  }, [value])
  const send = () => {
    const field = document.getElementById(fieldId)
    if (!(field instanceof HTMLInputElement) || !box.current || box.current.value.trim() === value) return
    field.value = box.current.value
    field.form?.requestSubmit()
  }
  return (
    <input ref={box} className="dimension-field" aria-label={label} defaultValue={value} placeholder={placeholder} maxLength={60} autoComplete="off"
      onBlur={send} onKeyDown={(event) => { if (event.key === 'Enter') { event.preventDefault(); send() } }} />
  )
}
