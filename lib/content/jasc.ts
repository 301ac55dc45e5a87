// Titles of the FAA's JASC system codes (content/jasc.json, with its source). For meaning, not exact wording.
import 'server-only'
import table from '@/content/jasc.json'

const codes: Record<string, { title: string }> = table.codes
const chapters: Record<string, string> = table.chapters

/** The title of a four-digit code, else its chapter's, else ''. */
export function jascTitle(code: string): string {
  return codes[code]?.title ?? chapters[code.slice(0, 2)] ?? ''
}
