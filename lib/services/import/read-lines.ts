// Splits the bytes of a file into lines. One line at a time, so that 64 MB are never a second copy as text.
import 'server-only'

export type ReadLine = { line: number; value: unknown } | { line: number; fault: string }

const newline = 0x0a

/** Every line that is not blank, counted from 1: parsed, or with what is wrong with it. A byte order mark is skipped. */
export function* readLines(bytes: Uint8Array): Generator<ReadLine> {
  const decoder = new TextDecoder('utf-8', { fatal: true })
  let start = bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf ? 3 : 0
  for (let line = 1; start < bytes.length; line++) {
    // Millions of empty lines cost nothing but this comparison.
    if (bytes[start] === newline) {
      start++
      continue
    }
    const found = bytes.indexOf(newline, start)
    const end = found === -1 ? bytes.length : found
    const read = readLine(decoder, bytes.subarray(start, end))
    if (read) yield { line, ...read }
    start = end + 1
  }
}

function readLine(decoder: TextDecoder, bytes: Uint8Array): { value: unknown } | { fault: string } | null {
  let text: string
  try {
    text = decoder.decode(bytes)
  } catch {
    return { fault: 'Not UTF-8.' }
  }
  if (text.trim() === '') return null
  try {
    return { value: JSON.parse(text) as unknown }
  } catch {
    return { fault: 'Not JSON.' }
  }
}
