// Keeps what is derived from a revision's text: its HTML and plain text, and the measurements of the plain text.
// The one way to keep a post's rendering; a remark's has no measurements.
import 'server-only'
import type { Transaction } from '@/db/client'
import { replaceMeasurements } from '@/db/mutations/measurements'
import { saveRendering } from '@/db/mutations/posts'
import { renderingKey } from '@/db/queries/cautioned-post'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import { parserVersion } from '@/lib/domain/measurements/measurement'
import type { Rendered } from './render-text'

/** Call in the transaction that writes the revision, after it. Of a revision that is not the current one only the rendering is kept. */
export async function saveText(tx: Transaction, postId: number, number: number, rendered: Rendered): Promise<void> {
  await saveRendering(tx, { key: renderingKey(postId, number), ...rendered })
  await saveMeasurements(tx, postId, number, rendered.plain)
}

/** The measurements alone, of a plain text that is kept already. False when `number` is not the current revision any more. */
export async function saveMeasurements(tx: Transaction, postId: number, number: number, plain: string): Promise<boolean> {
  return replaceMeasurements(tx, { postId, number, parser: parserVersion }, findMeasurements(plain))
}
