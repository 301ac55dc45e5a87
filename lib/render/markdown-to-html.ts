// Markdown as members type it, to HTML that can stand in a page. Pure; bundled into the worker, so it imports
// nothing of the server. Hostile text can make it slow: callers go through renderer.ts, which scans and stops the clock.
import { toText } from 'hast-util-to-text'
import rehypeSanitize from 'rehype-sanitize'
import rehypeStringify from 'rehype-stringify'
import remarkGfm from 'remark-gfm'
import remarkParse from 'remark-parse'
import remarkRehype from 'remark-rehype'
import { unified } from 'unified'
import { dressForPage } from './dress-for-page'
import { dressMeasurements } from './dress-measurements'
import { keepAsText } from './keep-as-text'
import { sanitizeSchema } from './sanitize-schema'

/** Raise it when the same text gives other HTML: kept HTML of another version is rendered anew. */
export const rendererVersion = 2

export interface RenderedText {
  /** Sanitised HTML without a wrapping element. */
  html: string
  /** What a reader sees, without marks: for search, snippets, measurements. Blocks are set apart by line feeds. */
  plain: string
}

/** Renders with headings as h4 to h6 and what the page needs. `text` is as `normalizeText` gives it. */
export function markdownToHtml(text: string): RenderedText {
  const tree = pageTree.runSync(pageTree.parse(text))
  // The plain text is read before dressing: labels for screen readers and conversions are not the member's words.
  // A line after a hard break or a checkbox comes out one space in.
  const plain = toText(tree).replace(/^ (?=\S)/gm, '').trim()
  dressForPage(tree)
  dressMeasurements(tree)
  return { html: stringify.stringify(tree), plain }
}

/** The same without our dressing and with headings unmoved: what the CommonMark and GFM examples are compared with. */
export function markdownToBareHtml(text: string): string {
  return stringify.stringify(bareTree.runSync(bareTree.parse(text)))
}

const treeProcessor = (shiftHeadings: boolean) =>
  unified().use(remarkParse).use(remarkGfm).use(keepAsText, { shiftHeadings }).use(remarkRehype).use(rehypeSanitize, sanitizeSchema).freeze()

const pageTree = treeProcessor(true)
const bareTree = treeProcessor(false)
const stringify = unified().use(rehypeStringify).freeze()
