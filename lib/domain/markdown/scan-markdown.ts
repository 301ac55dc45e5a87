// Refuses Markdown that would cost the parser too much, in one pass over each line and without parsing it.
// It errs on the side of refusing, also inside code fences: the parser decides what a fence is, not this scan.
// What gets past it is stopped by the time limit in lib/render.
import { countLinks, longestAddress } from './count-links'
import { createContainerDepth } from './container-depth'
import { createTableCount } from './table-count'
import { isNormalText } from './normalize-text'
import { pairDepth, type PairDepth } from './pair-depth'

/** The most that one text may hold. Measured with remark 11 and GFM: each alone stays under 500 ms. */
export const markdownLimits = {
  characters: 20_000,
  lines: 2_000,
  /** The same delimiter in a row: `*`, `_`, `~`, backtick. */
  run: 50,
  /** Runs of `*`, `_` and `~` in the whole text. */
  runs: 2_000,
  /** Quotes, lists, brackets, emphasis. */
  nesting: 20,
  /** Quote and list marks in the whole text. */
  marks: 2_000,
  links: 50,
  addressCharacters: 2_000,
  tableColumns: 50,
  tableCells: 2_000,
} as const

export type MarkdownScan = { ok: true } | { ok: false; message: string }

const say = (count: number): string => count.toLocaleString('en')
const refuse = (message: string): MarkdownScan => ({ ok: false, message })

/**
 * Says whether `text` (as `normalizeText` gives it) may be parsed; if not, `message` tells its writer in
 * plain words what to change. Linear in the length of the text; the length is looked at first.
 */
export function scanMarkdown(text: string): MarkdownScan {
  const limits = markdownLimits
  if (text.length > limits.characters) {
    return refuse(`The text is ${say(text.length)} characters long. The limit is ${say(limits.characters)}: shorten it, or split it in two.`)
  }
  if (!isNormalText(text)) return refuse('The text holds control characters that cannot be shown. Paste it as plain text.')
  const lines = text.split('\n')
  if (lines.length > limits.lines) {
    return refuse(`The text has ${say(lines.length)} lines. The limit is ${say(limits.lines)}: join some, or split the text in two.`)
  }
  return scanLines(lines) ?? scanLinks(text) ?? { ok: true }
}

function scanLines(lines: readonly string[]): MarkdownScan | null {
  const containers = createContainerDepth()
  const tables = createTableCount()
  const pairs = pairDepth()
  for (const [index, line] of lines.entries()) {
    const at = `Line ${say(index + 1)}`
    const found = scanMarks(at, pairs, line) ?? scanContainers(at, containers.next(line), containers.marks())
    if (found) return found
    const table = tables.next(line)
    if (table.columns > markdownLimits.tableColumns) return refuse(`${at}: the table is wider than ${markdownLimits.tableColumns} columns.`)
    if (table.cells > markdownLimits.tableCells) return refuse(`${at}: the tables hold more than ${say(markdownLimits.tableCells)} cells. Leave out rows that nobody needs.`)
  }
  return null
}

function scanMarks(at: string, pairs: PairDepth, line: string): MarkdownScan | null {
  const seen = pairs.next(line)
  if (seen.longestRun > markdownLimits.run) {
    return refuse(`${at} has more than ${markdownLimits.run} of the same mark (* _ ~ or \`) in a row. Take some out.`)
  }
  if (seen.runs > markdownLimits.runs) return refuse(`The text has more than ${say(markdownLimits.runs)} marks for emphasis (* _ ~). Take some out.`)
  if (seen.depth > markdownLimits.nesting) {
    return refuse(`${at} has brackets or emphasis more than ${markdownLimits.nesting} deep. Take some of the marks out.`)
  }
  return null
}

function scanContainers(at: string, depth: number, marks: number): MarkdownScan | null {
  if (depth > markdownLimits.nesting) return refuse(`${at} stands more than ${markdownLimits.nesting} quotes or lists deep. Bring it further out.`)
  if (marks > markdownLimits.marks) return refuse(`The text has more than ${say(markdownLimits.marks)} quote and list marks. Split it in two.`)
  return null
}

function scanLinks(text: string): MarkdownScan | null {
  if (countLinks(text) > markdownLimits.links) return refuse(`The text has more than ${markdownLimits.links} links. Keep the ones a builder needs.`)
  if (longestAddress(text) > markdownLimits.addressCharacters) {
    return refuse(`An address in the text is longer than ${say(markdownLimits.addressCharacters)} characters. Shorten it.`)
  }
  return null
}
