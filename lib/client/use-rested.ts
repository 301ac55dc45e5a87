// A value that follows another one after it has rested: for searching while somebody types.
import { useEffect, useState } from 'react'

/** `value` as it was when it last stayed unchanged for `delayMs`. */
export function useRested<T>(value: T, delayMs: number): T {
  const [rested, setRested] = useState(value)
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), delayMs)
    return () => clearTimeout(timer)
  }, [value, delayMs])
  return rested
}
