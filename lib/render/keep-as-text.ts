// Works on the Markdown tree: what members' text may not be (HTML, images, footnotes with ids) stays as the text
// that was typed, because nothing typed is lost; headings move below those of the page.
import type { FootnoteDefinition, Heading, Root, RootContent } from 'mdast'
import { SKIP, visit } from 'unist-util-visit'

/** A unified plugin; `shiftHeadings: false` leaves headings where the specifications have them. */
export function keepAsText({ shiftHeadings }: { shiftHeadings: boolean }) {
  return (tree: Root): void => {
    visit(tree, (node, index, parent) => {
      if (node.type === 'heading' && shiftHeadings) node.depth = shiftedDepth(node.depth)
      if (!parent || index === undefined) return
      if (node.type === 'footnoteDefinition') {
        parent.children.splice(index, 1, ...labelled(node))
        return index
      }
      const kept = textInPlaceOf(node)
      if (!kept) return
      parent.children[index] = holdsBlocks.has(parent.type) && kept.type === 'text' ? { type: 'paragraph', children: [kept] } : kept
      return [SKIP, index + 1]
    })
  }
}

const holdsBlocks: ReadonlySet<string> = new Set(['root', 'blockquote', 'listItem', 'footnoteDefinition'])

/** The page keeps h1 to h3 for itself. */
const shiftedDepth = (depth: Heading['depth']): Heading['depth'] => (depth === 1 ? 4 : depth === 2 ? 5 : 6)

function textInPlaceOf(node: Root | RootContent): Extract<RootContent, { type: 'text' | 'break' }> | null {
  switch (node.type) {
    case 'image': return { type: 'text', value: node.alt || node.url }
    case 'imageReference': return { type: 'text', value: node.alt || (node.label ?? node.identifier) }
    case 'footnoteReference': return { type: 'text', value: `[${node.label ?? node.identifier}]` }
    // A table cell has no other way to hold a second line, so this one element does what its writer meant.
    case 'html': return /^<br *\/?>$/i.test(node.value) ? { type: 'break' } : { type: 'text', value: node.value }
    default: return null
  }
}

/** A footnote stays where it was written, behind its label: an id would clash between two posts of a page. */
function labelled(note: FootnoteDefinition): RootContent[] {
  const label = { type: 'text' as const, value: `[${note.label ?? note.identifier}] ` }
  const [first, ...rest] = note.children
  if (first?.type === 'paragraph') return [{ ...first, children: [label, ...first.children] }, ...rest]
  return [{ type: 'paragraph', children: [label] }, ...note.children]
}
