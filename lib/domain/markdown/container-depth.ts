// How deep quotes and lists stand, line by line, read from the marks that open a line. Fences are not looked at.

interface LineStart { quotes: number; lists: number; listColumns: number[]; indent: number; blank: boolean }

export interface ContainerDepth {
  /** Takes the next line; returns how many quotes and lists it stands in, estimated from above. */
  next(line: string): number
  /** Quote and list marks seen so far. */
  marks(): number
}

/** Counts through one text; make a new one for the next. */
export function createContainerDepth(): ContainerDepth {
  let open: number[] = []
  let total = 0
  return {
    next(line) {
      const start = readLineStart(line)
      total += start.quotes + start.lists
      if (start.blank) return open.length
      // A list stays open for what is indented past its mark; a line further left closes it.
      open = open.filter((column) => column < start.indent)
      open.push(...start.listColumns)
      return open.length + start.quotes
    },
    marks: () => total,
  }
}

const bullet = /[-+*]/

function readLineStart(line: string): LineStart {
  const start: LineStart = { quotes: 0, lists: 0, listColumns: [], indent: -1, blank: false }
  if (isThematicBreak(line)) return { ...start, indent: indentOf(line) }
  let column = 0
  let at = 0
  for (;;) {
    while (line[at] === ' ' || line[at] === '\t') {
      column += line[at] === '\t' ? 4 - (column % 4) : 1
      at += 1
    }
    if (at >= line.length) break
    const width = line[at] === '>' ? 1 : listMarkWidth(line, at)
    if (width === 0) break
    if (line[at] === '>') {
      start.quotes += 1
    } else {
      start.lists += 1
      start.listColumns.push(column)
      if (start.indent < 0) start.indent = column
    }
    at += width
    column += width
  }
  if (start.indent < 0) start.indent = column
  start.blank = start.quotes + start.lists === 0 && at >= line.length
  return start
}

/** Width of the list mark at `at` (`-`, `12.`, `3)` before a space or the end), or 0. */
function listMarkWidth(line: string, at: number): number {
  let width = 0
  if (bullet.test(line[at] ?? '')) width = 1
  else {
    while (width < 9 && isDigit(line[at + width])) width += 1
    const after = line[at + width]
    if (width === 0 || (after !== '.' && after !== ')')) return 0
    width += 1
  }
  const next = line[at + width]
  return next === undefined || next === ' ' || next === '\t' ? width : 0
}

const isDigit = (character: string | undefined): boolean => character !== undefined && character >= '0' && character <= '9'
const indentOf = (line: string): number => line.length - line.trimStart().length

/** `* * *`, `---`: a rule across the page, not a nest of lists. A long one is no rule anybody types. */
function isThematicBreak(line: string): boolean {
  return line.length <= 200 && /^[ \t]*(?:(?:\*[ \t]*){3,}|(?:-[ \t]*){3,}|(?:_[ \t]*){3,})$/.test(line)
}
