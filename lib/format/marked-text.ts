// Cuts a plain text at marked ranges so that a component can set them apart without building HTML from strings.

export interface TextPart {
  readonly text: string
  readonly marked: boolean
}

/** Ranges are UTF-16 offsets [start, end); unordered, overlapping or outside ones are merged and clamped. */
export function markedText(text: string, marks: readonly (readonly [number, number])[]): TextPart[] {
  const parts: TextPart[] = []
  let at = 0
  for (const [from, to] of [...marks].sort((a, b) => a[0] - b[0])) {
    const start = Math.max(at, Math.min(from, text.length))
    const end = Math.min(to, text.length)
    if (end <= start) continue
    if (start > at) parts.push({ text: text.slice(at, start), marked: false })
    parts.push({ text: text.slice(start, end), marked: true })
    at = end
  }
  if (at < text.length) parts.push({ text: text.slice(at), marked: false })
  return parts
}
