// Counts table cells from delimiter rows (`| --- | :-: |`). A short row is filled up to the width of its
// header, so two characters can cost fifty cells: the width is multiplied, whatever the row holds.

export interface TableCount {
  /** Takes the next line; returns the width of the table it stands in (0: none) and all cells so far. */
  next(line: string): { columns: number; cells: number }
}

const delimiterRow = /^[ \t>+*.)0-9|:-]*$/

/** Counts through one text; make a new one for the next. */
export function createTableCount(): TableCount {
  let columns = 0
  let cells = 0
  return {
    next(line) {
      if (line.trim() === '') columns = 0
      const width = delimiterWidth(line)
      if (width > 0) {
        columns = Math.max(columns, width)
        cells += width
      }
      cells += columns
      return { columns, cells }
    },
  }
}

function delimiterWidth(line: string): number {
  if (!/[|:]/.test(line) || !delimiterRow.test(line)) return 0
  return line.split('|').filter((cell) => cell.includes('-')).length
}
