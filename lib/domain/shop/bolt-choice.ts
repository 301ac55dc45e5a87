// Which bolt for a thickness, and what the wrong one looks like. Designations are bolt-designation.ts.
import data from '@/content/shop/bolts.json'
import { boltLengths, boltThread, type BoltLength } from './bolt-designation'

/** Inches by which a grip may fall short and still be called the thickness: less than the bolts themselves vary. */
const SLACK = 0.005

export interface BoltChoice {
  /** The shortest grip not under the thickness: what is too long is taken up with washers. */
  choice: BoltLength | null
  longer: BoltLength | null
  shorter: BoltLength | null
}

/** The bolt whose grip just covers `thickness` (sheets and washers, inches), with its neighbours. Null where the table ends. */
export function chooseBolt(bolt: string, thickness: number): BoltChoice {
  const lengths = boltLengths(bolt)
  const at = lengths.findIndex(({ grip }) => grip >= thickness - SLACK)
  if (at < 0) return { choice: null, longer: null, shorter: lengths.at(-1) ?? null }
  return { choice: lengths[at] ?? null, longer: lengths[at + 1] ?? null, shorter: lengths[at - 1] ?? null }
}

/** Shank that stands past the stack before the thread begins; negative: thread stands in the hole. Inches. */
export const shankPast = (entry: BoltLength, thickness: number): number => entry.grip - thickness

/** Threads that bear in the hole, 0 when the shank covers it. Runout of the thread isn't counted. */
export function threadsInHole(bolt: string, entry: BoltLength, thickness: number): number {
  const thread = boltThread(bolt)
  return thread ? Math.max(0, (thickness - entry.grip) * thread.threadsPerInch) : 0
}

/** Threads that show past a nut of `nutHeight` inches; negative: the end of the bolt is inside the nut. */
export function threadsPastNut(bolt: string, entry: BoltLength, thickness: number, nutHeight: number): number {
  const thread = boltThread(bolt)
  return thread ? (entry.length - thickness - nutHeight) * thread.threadsPerInch : 0
}

/** The sentence for a bolt that is in hand. */
export function choiceWords(bolt: string, entry: BoltLength, thickness: number): string {
  const past = shankPast(entry, thickness)
  const inside = threadsInHole(bolt, entry, thickness)
  if (Math.abs(past) <= SLACK) return 'the grip is the thickness'
  if (inside > data.threadsInHole.threads + 1e-9) return `too short: about ${inside.toFixed(1)} threads would bear in the hole`
  if (inside > 0) return `a little short: about ${inside.toFixed(1)} threads in the hole, allowed by the Navy text only in the thicker member`
  if (past > 1 / 8) return `too much shank: ${past.toFixed(3)} in past the stack, the nut would run out of thread before it clamps`
  return `shank stands ${past.toFixed(3)} in past the stack: take it up with a washer, or the nut bottoms on the shank`
}
