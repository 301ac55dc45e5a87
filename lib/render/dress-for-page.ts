// Works on the sanitised HTML tree: adds what our pages need. It runs after sanitising, so whatever it adds is ours.
import type { Element, ElementContent, Root, RootContent } from 'hast'

const rightToLeft = /[\u0590-\u08FF\uFB1D-\uFDFF\uFE70-\uFEFC]/
const textBlocks: ReadonlySet<string> = new Set(['p', 'li', 'td', 'th', 'h4', 'h5', 'h6'])

/** Adds, in place: link relations, names for checkboxes, scrolling from the keyboard, the direction of right-to-left text. */
export function dressForPage(tree: Root): void {
  tree.children = dressAll(tree.children)
}

function dressAll<Node extends RootContent>(nodes: readonly Node[]): (Node | ElementContent)[] {
  return nodes.flatMap((node): (Node | ElementContent)[] => (node.type === 'element' ? dress(node) : [node]))
}

function dress(node: Element): ElementContent[] {
  node.children = dressAll(node.children)
  if (textBlocks.has(node.tagName) && rightToLeft.test(ownText(node))) node.properties['dir'] = 'auto'
  switch (node.tagName) {
    case 'a':
      // The address was refused: what is left is text, and must not look like a link.
      if (node.properties['href'] === undefined) return node.children
      node.properties['rel'] = ['nofollow', 'noopener', 'ugc']
      // Legal inside an attribute, but no later reader of the HTML should have to know that.
      if (typeof node.properties['title'] === 'string') node.properties['title'] = node.properties['title'].replaceAll('<', '‹').replaceAll('>', '›')
      return [node]
    case 'input':
      node.properties['ariaLabel'] = node.properties['checked'] ? 'done' : 'to do'
      return [node]
    case 'pre':
      // Wide content scrolls sideways, and must do so from the keyboard too.
      node.properties['tabIndex'] = 0
      return [node]
    case 'table':
      return [{ type: 'element', tagName: 'div', properties: { className: ['table-scroll'], role: 'group', ariaLabel: 'Table', tabIndex: 0 }, children: [node] }]
    default:
      return [node]
  }
}

/** The text in `node` without that of deeper blocks, which carry their own direction. */
function ownText(node: Element): string {
  return node.children.map((child) => {
    if (child.type === 'text') return child.value
    return child.type === 'element' && !textBlocks.has(child.tagName) ? ownText(child) : ''
  }).join('')
}
