// Where each line of an order strip runs: a row a task, the base line through all, departures in lanes at its left. Pure; drawing is components/order.

export interface StripLine { before: string; after: string; builders: number }
/** What a lane shows in a row: it begins at the row's hole, passes, or ends there. */
export type LanePart = 'none' | 'start' | 'through' | 'end'
export interface StripRow { task: string; lanes: LanePart[] }

/** One row a task with as many lanes as lines overlap. Lines whose tasks don't stand in this order are left out. Shorter lines lie nearer to the base line. */
export function layStrip(tasks: readonly string[], lines: readonly StripLine[]): StripRow[] {
  const placed = lines.map((line) => ({ from: tasks.indexOf(line.before), to: tasks.indexOf(line.after) })).filter(({ from, to }) => from >= 0 && to > from)
    .sort((a, b) => a.to - a.from - (b.to - b.from) || a.from - b.from)
  const lanes: { from: number; to: number }[][] = []
  for (const line of placed) {
    const free = lanes.find((lane) => lane.every((other) => line.to < other.from || line.from > other.to))
    if (free) free.push(line)
    else lanes.push([line])
  }
  return tasks.map((task, row) => ({ task, lanes: lanes.map((lane) => partAt(lane, row)) }))
}

function partAt(lane: readonly { from: number; to: number }[], row: number): LanePart {
  const line = lane.find(({ from, to }) => row >= from && row <= to)
  if (!line) return 'none'
  return row === line.from ? 'start' : row === line.to ? 'end' : 'through'
}
