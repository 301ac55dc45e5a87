// A second process that writes entries at a steady rate into the same file, started by bench-search.ts; each holds a word of its own.
import { openDatabase } from '@/db/client'
import { readPlaces, writeTexts } from './fill-database'
import { generateText } from './generate-texts'

export interface WritingTask { databaseFile: string; seed: number; firstNumber: number; rate: number; seconds: number }
/** Of every tenth entry: its word, and when the write had been committed. */
export interface Written { word: string; at: number }
export interface WritingEnded { written: number; behind: number }

const tenth = 10

process.once('message', (task: WritingTask) => { void write(task) })

async function write({ databaseFile, seed, firstNumber, rate, seconds }: WritingTask): Promise<void> {
  const database = await openDatabase(databaseFile)
  const places = await readPlaces(database)
  const begun = performance.now()
  let behind = 0
  for (let i = 0; i < rate * seconds; i++) {
    const due = begun + (i * 1000) / rate
    await new Promise((resolve) => setTimeout(resolve, Math.max(0, due - performance.now())))
    behind = Math.max(behind, performance.now() - due)
    // With figures, so that nothing is looked for in its place while it is not there: asking for it costs next to nothing.
    const word = `qz${firstNumber + i}`
    const text = generateText(firstNumber + i, seed)
    await writeTexts(database, [{ ...text, title: `${text.title} ${word}` }], places)
    if (i % tenth === 0) process.send?.({ word, at: Date.now() } satisfies Written)
  }
  database.close()
  process.send?.({ written: rate * seconds, behind: Math.round(behind) } satisfies WritingEnded)
  process.disconnect()
}
