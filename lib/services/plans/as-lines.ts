// Kept rows as lines that can be pasted back: the whole list in a text field, to be put in another order or mended.
import 'server-only'

/** One comma-separated line a row, under a head line; values with commas, quotes or line feeds in quotes. '' for no rows. */
export function asLines<C extends string>(columns: readonly C[], rows: readonly Partial<Record<C, string | number | null>>[]): string {
  if (rows.length === 0) return ''
  return [columns.join(','), ...rows.map((row) => columns.map((c) => quoted(String(row[c] ?? ''))).join(','))].join('\n')
}

const quoted = (value: string) => (/[",;\t\n]/.test(value) ? `"${value.replaceAll('"', '""')}"` : value)
