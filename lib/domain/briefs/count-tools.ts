// From the tools that builders name in their own words to a short list with how many name each. Pure.
import { analyseText } from '../search/analyse-text'

export interface ToolsTold { builder: string; text: string; postId: number | null }
export interface ToolCount { name: string; builders: number; postIds: number[] }

/** Most named first, then by name. "Fluting pliers" and "fluting pliers with polished jaws" are one tool, called by the shorter name. */
export function countTools(told: readonly ToolsTold[]): ToolCount[] {
  const named = told.flatMap((one) => phrasesOf(one.text).map((name) => ({ ...one, name, words: new Set(analyseText(name).tokens.map((t) => t.term)) })))
    .filter(({ words }) => words.size > 0).sort((a, b) => a.words.size - b.words.size || a.name.length - b.name.length || (a.name < b.name ? -1 : 1))
  const tools: { name: string; words: ReadonlySet<string>; builders: Set<string>; postIds: Set<number> }[] = []
  for (const { name, words, builder, postId } of named) {
    const known = tools.find((tool) => isSame(tool.words, words))
    const tool = known ?? { name: name.charAt(0).toUpperCase() + name.slice(1), words, builders: new Set(), postIds: new Set() }
    tool.builders.add(builder)
    if (postId !== null) tool.postIds.add(postId)
    if (!known) tools.push(tool)
  }
  return tools.map(({ name, builders, postIds }) => ({ name, builders: builders.size, postIds: [...postIds].sort((a, b) => a - b) }))
    .sort((a, b) => b.builders - a.builders || (a.name < b.name ? -1 : 1))
}

/** One word alone says too little to swallow a longer name: "tape" is not "masking tape". */
const isSame = (short: ReadonlySet<string>, long: ReadonlySet<string>) =>
  [...short].every((word) => long.has(word)) && (short.size === long.size || short.size > 1)

/** Parts between commas, semicolons and line ends, without what stands in brackets and without Markdown's stars. */
function phrasesOf(text: string): string[] {
  return text.replace(/\([^)]*\)/gu, '').replace(/[*_`]/gu, '').split(/[,;\n]|\.(?:\s|$)/u)
    .map((phrase) => phrase.replace(/^\s*(?:[-•]|and )\s*/u, '').replace(/\s+/gu, ' ').trim()).filter((phrase) => phrase.length > 1 && phrase.length <= 80)
}
