// Markdown as it will look, for the writing pages.
import 'server-only'
import type { AppContext } from '@/lib/context'
import { renderText } from './render-text'

/** Sanitised HTML; 422 in words when the text cannot be rendered safely. */
export async function previewText(context: AppContext, body: string): Promise<{ html: string; measurements: never[] }> {
  if (body.trim() === '') return { html: '', measurements: [] }
  const { html } = await renderText(context.renderer, [{ name: 'body', text: body }])
  return { html: html['body'] ?? '', measurements: [] }
}
