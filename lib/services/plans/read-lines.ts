// Lines of a list as a steward pastes them (CSV, semicolons or a spreadsheet's tabs) -> values by column. A bad line names itself
// and the rest goes on.
import 'server-only'
import { parse, type CsvError, type Info } from 'csv-parse/sync'
import type { z } from 'zod'
import { maxLines } from '@/lib/schemas/plans'

export interface BadLine { line: number; message: string; raw: string }
export interface ReadLines<T> { good: { line: number; value: T; raw: string }[]; bad: BadLine[] }

interface Layout<T> {
  /** Columns in the order of a text without a head line. */
  columns: readonly string[]
  schema: z.ZodType<T>
}

/** Reads at most 500 lines. The first line may name the columns, in any order and case. */
export function readLines<T>(text: string, { columns, schema }: Layout<T>): ReadLines<T> {
  const result: ReadLines<T> = { good: [], bad: [] }
  const records = recordsOf(text, result.bad)
  const head = records[0]?.record.map((name) => name.trim().toLowerCase())
  const hasHead = head?.[0] !== undefined && head.every((name) => columns.includes(name)) && new Set(head).size === head.length
  const names = hasHead ? head : columns
  for (const { record, line, raw } of hasHead ? records.slice(1) : records) {
    const refuse = (message: string) => result.bad.push({ line, message, raw })
    if (result.good.length >= maxLines) refuse(`More than ${maxLines} lines at once.`)
    else if (record.length > names.length && record.slice(names.length).some((v) => v.trim() !== '')) refuse(`More than ${names.length} columns. Put a text with a comma in quotes.`)
    else {
      const parsed = schema.safeParse(Object.fromEntries(names.map((name, i) => [name, record[i] ?? ''])))
      if (parsed.success) result.good.push({ line, value: parsed.data, raw })
      else refuse(parsed.error.issues.map((issue) => `${String(issue.path[0] ?? 'line')}: ${issue.message}`).join(' '))
    }
  }
  result.bad.sort((a, b) => a.line - b.line)
  return result
}

interface Found { record: string[]; line: number; raw: string }

function recordsOf(text: string, bad: BadLine[]): Found[] {
  const skipped = (error: CsvError | undefined, raw: string | undefined) => {
    if (error) bad.push({ line: Number(error['lines'] ?? 0), message: 'A quotation mark is out of place.', raw: (raw ?? '').trimEnd() })
    return undefined
  }
  const rows = parse(text, {
    bom: true, delimiter: delimiterOf(text), relax_column_count: true, skip_empty_lines: true, skip_records_with_error: true, raw: true, info: true, trim: true, on_skip: skipped,
  }) as unknown as { record: string[]; info: Info; raw: string }[]
  return rows.filter((r) => r.record.some((v) => v !== '')).map((r) => ({ record: r.record, line: r.info.lines, raw: r.raw.trim() }))
}

/** What divides the columns: a tab or a semicolon in the first line, else the comma. */
function delimiterOf(text: string): string {
  const first = text.trimStart().split('\n', 1)[0] ?? ''
  return ['\t', ';'].find((d) => first.includes(d)) ?? ','
}
