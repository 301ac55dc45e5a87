// Works on the sanitised HTML tree: its blocks of running text, as measurements are found in them. Sets nothing and changes nothing.
import type { Element, Root, Text } from 'hast'

/** A text node and where it begins in its block's text. */
export interface Run { parent: Element; node: Text; start: number }

export interface Block {
  /** All its words, those of code and links too: they are what stands beside a number. */
  text: string
  /** The text nodes that may be changed. */
  runs: Run[]
  isTable: boolean
}

const inline: ReadonlySet<string> = new Set(['a', 'br', 'code', 'del', 'em', 'input', 'strong'])
/** What is quoted letter by letter, tapped or struck out stays as it is, and so do headings, as titles do. */
const leftAlone: ReadonlySet<string> = new Set(['a', 'code', 'del'])
const noText: ReadonlySet<string> = new Set(['pre', 'h1', 'h2', 'h3', 'h4', 'h5', 'h6'])

/** In the order of the page; blocks without text that may be changed are left out. */
export function readBlocks(tree: Root): Block[] {
  const blocks: Block[] = []
  for (const child of tree.children) if (child.type === 'element' && !noText.has(child.tagName)) readBlock(child, false, blocks)
  return blocks
}

function readBlock(element: Element, inTable: boolean, blocks: Block[]): void {
  const isTable = inTable || element.tagName === 'table'
  let block: Block = { text: '', runs: [], isTable }
  const close = (): void => {
    if (block.runs.length > 0) blocks.push(block)
    block = { text: '', runs: [], isTable }
  }
  for (const child of element.children) {
    if (child.type === 'text') readText(child, element, block, true)
    else if (child.type === 'element' && inline.has(child.tagName)) readInline(child, block, true)
    else if (child.type === 'element') {
      close()
      if (!noText.has(child.tagName)) readBlock(child, isTable, blocks)
    }
  }
  close()
}

function readInline(element: Element, block: Block, isFree: boolean): void {
  if (element.tagName === 'br') block.text += '\n'
  const staysFree = isFree && !leftAlone.has(element.tagName)
  for (const child of element.children) {
    if (child.type === 'text') readText(child, element, block, staysFree)
    else if (child.type === 'element') readInline(child, block, staysFree)
  }
}

function readText(node: Text, parent: Element, block: Block, isFree: boolean): void {
  if (isFree && /\S/.test(node.value)) block.runs.push({ parent, node, start: block.text.length })
  block.text += node.value
}
