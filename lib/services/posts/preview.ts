// Markdown as it will look, for the writing pages.
import 'server-only'
import type { AppContext } from '@/lib/context'
import { findMeasurements } from '@/lib/domain/measurements/find-measurements'
import type { Measurement } from '@/lib/schemas/measurement'
import { renderText } from './render-text'

/** Sanitised HTML, and the measurements with their places in the Markdown as sent; 422 in words when the text cannot be rendered safely. */
export async function previewText(context: AppContext, body: string): Promise<{ html: string; measurements: Measurement[] }> {
  if (body.trim() === '') return { html: '', measurements: [] }
  const { html } = await renderText(context.renderer, [{ name: 'body', text: body }])
  return { html: html['body'] ?? '', measurements: findMeasurements(body) }
}
