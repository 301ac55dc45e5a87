// Renders what somebody wrote, before any transaction: a text that cannot be rendered safely is refused, not stored.
import 'server-only'
import { rendererVersion } from '@/lib/render/markdown-to-html'
import { TextRefusedError, type Renderer } from '@/lib/render/renderer'
import { refuse } from '@/lib/errors'

export interface Rendered { html: Record<string, string>; plain: string; renderer: number }

/** HTML by field and the plain text of all; 422 naming the field when the text is refused. */
export async function renderText(renderer: Renderer, fields: readonly { name: string; text: string }[]): Promise<Rendered> {
  try {
    const { html, plain } = await renderer.render(Object.fromEntries(fields.map((f) => [f.name, f.text])))
    return { html, plain: fields.map((f) => plain[f.name] ?? '').filter((p) => p !== '').join('\n\n'), renderer: rendererVersion }
  } catch (error) {
    if (error instanceof TextRefusedError) throw refuse.invalid(error.field === 'body' ? 'body' : `parts.${error.field}`, error.message)
    throw error
  }
}
