// Chooses what of a brief goes on its two printed pages. How much room there is stands in lib/domain/briefs/fit-print.
import { linesOf, linesOfFirstPage, linesOfSecondPage, takeLines } from '@/lib/domain/briefs/fit-print'
import type { Brief, BriefItem, BriefSize } from '@/lib/schemas/brief'

const mostDepartures = 3
const mostDisputes = 3
const mostTools = 10

export interface PrintedSize { size: BriefSize; task: string }
export interface PrintedItem { item: BriefItem; task: string; builders: number }

/** The plate has all the room it needs, then what was said of the order, then as many tasks as fit. */
export function fitOrder({ cautions, tasks, order: { departures, disagreements } }: Brief) {
  // Two columns, smaller type; half a line is lost at the end of every topic.
  const plate = cautions.reduce((sum, c) => sum + (c.signalWord === 'WARNING' ? c.text : c.short).length / 110 + 0.5, 2)
  const said = 2 * (Math.min(departures.length, mostDepartures) + Math.min(disagreements.length, mostDisputes))
  const fitting = takeLines(tasks, Math.max(0, linesOfFirstPage - plate - said), (task) => linesOf(`${task.title} ${'·'.repeat(24)} ${mentions(task.cautions)}`))
  const fits = { tasks: fitting.taken, departures: departures.slice(0, mostDepartures), disputes: disagreements.slice(0, mostDisputes) }
  return { ...fits, leftOut: tasks.length - fits.tasks.length + departures.length - fits.departures.length + disagreements.length - fits.disputes.length }
}

/** Closing lines and sizes before words, stamped before not stamped, then open questions. */
export function fitSecondPage(brief: Brief) {
  const all = [...brief.tasks, ...brief.unplaced]
  const sizes = all.flatMap((task): PrintedSize[] => task.sizes.map((size) => ({ size, task: task.title })))
  const knowHow = all.flatMap((task): PrintedItem[] => task.knowHow.map((item) => ({ item, task: task.title, builders: 1 })))
  const lessons = all.flatMap((task): PrintedItem[] => task.lessons.map(({ lead, builders }) => ({ item: lead, task: task.title, builders })))
  const tools = brief.tools.slice(0, mostTools)
  const fixed = 8 + linesOf(tools.map((t) => t.name).join('; '), 1) + (brief.hours ? 2 : 0)
  const closing = takeLines(brief.closing, Math.min(14, linesOfSecondPage - fixed), (line) => linesOf(line.text))
  const fittingSizes = takeLines(sizes, Math.min(14, linesOfSecondPage - fixed - (14 - closing.room)), ({ size }) => linesOf(`${size.claim} ${size.expected} ${size.source?.title ?? ''} ${mentions(size.cautions)}`, 1))
  const room = linesOfSecondPage - fixed - (14 - closing.room) - (14 - fittingSizes.room)
  const items = takeLines([...knowHow, ...lessons.sort((a, b) => b.builders - a.builders)], room, sizeOfItem)
  const open = takeLines(all.flatMap((task) => task.open), items.room, (item) => linesOf(`${item.title} ${mentions(item.cautions)}`))
  return { sizes: fittingSizes.taken, items: items.taken, open: open.taken, closing: closing.taken, tools, leftOut: fittingSizes.leftOut + items.leftOut + open.leftOut + closing.leftOut }
}

const mentions = (cautions: readonly { signalWord: string; title: string }[]) => cautions.map((c) => `${c.signalWord} ${c.title}`).join(', ')
const sizeOfItem = ({ item, task }: PrintedItem) => linesOf(`${task} ${item.title} ${'·'.repeat(60)} ${mentions(item.cautions)}`) + linesOf(item.passage, 0.4)
