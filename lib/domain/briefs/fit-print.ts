// What of a brief fits two printed pages, by how much room each line takes; what is left out is counted, never silently gone. Pure.

/** Lines of a page, of both A4 and Letter, at the print's size of type; a title's room is off the first. */
export const linesOfFirstPage = 58
export const linesOfSecondPage = 62
const charactersOfLine = 112

/** Lines that a text takes; an empty one takes none. */
export const linesOf = (text: string, extra = 0): number => (text === '' ? 0 : Math.ceil(text.length / charactersOfLine) + extra)

/** The first items that fit into `room` lines together, and what remains of the room. One that does not fit ends the list, so that the order stays. */
export function takeLines<T>(items: readonly T[], room: number, sizeOf: (item: T) => number): { taken: T[]; leftOut: number; room: number } {
  let left = room
  let count = 0
  for (const item of items) {
    const size = sizeOf(item)
    if (size > left) break
    left -= size
    count += 1
  }
  return { taken: items.slice(0, count), leftOut: items.length - count, room: left }
}
