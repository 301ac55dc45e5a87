// What typed text is turned into before it is stored, counted, scanned or rendered. Nothing about Markdown is here.

// C0 and C1 controls except tab and line feed (handled below), the byte order mark, and the explicit
// directional characters: embeddings, overrides and isolates. An override can show `#30` as `03#`, and a
// number that reads differently from what is stored can cost a part. Right-to-left text does not need
// them: the bidirectional algorithm orders it, LRM and RLM stay, and so do the joiners that emoji use.
const unwanted = /[\u0000-\u0008\u000B\u000C\u000E-\u001F\u007F-\u0084\u0086-\u009F\uFEFF\u202A-\u202E\u2066-\u2069]/g
const loneSurrogate = /\p{Surrogate}/gu
const lineEnd = /\r\n?|[\u0085\u2028\u2029]/g

/**
 * Text as it is kept: line ends are `\n`; control characters, byte order marks and directional overrides
 * are gone; half a surrogate pair is U+FFFD. Everything else, spaces and letter forms included, stays as
 * typed, and doing it twice changes nothing. Offsets of measurements count in this text.
 */
export function normalizeText(text: string): string {
  return text.replace(lineEnd, '\n').replace(unwanted, '').replace(loneSurrogate, '\uFFFD')
}

/** Whether `normalizeText` would leave `text` alone. */
export function isNormalText(text: string): boolean {
  return normalizeText(text) === text
}
