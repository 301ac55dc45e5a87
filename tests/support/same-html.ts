// Brings two ways of writing the same HTML together, as the CommonMark test runner's normaliser does:
// void elements, character references and line feeds beside block elements don't count.
const blocks = 'p|h[1-6]|ul|ol|li|blockquote|pre|hr|table|thead|tbody|tr|th|td'
const beside = new RegExp(`\\s*(</?(?:${blocks})(?: [^<>]*)?>)\\s*`, 'g')
const references: Record<string, string> = { lt: '\u27e8', gt: '\u27e9', amp: '&', quot: '"', '#x3C': '\u27e8', '#x26': '&', '#x27': "'", '#x22': '"', '#39': "'" }

/** `html` in one spelling. White space inside `pre` is compared as it is. */
export function sameHtml(html: string): string {
  return html
    .split(/(<pre[\s\S]*?<\/pre>)/)
    .map((part) => (part.startsWith('<pre') ? part : part.replace(beside, '$1')))
    .join('')
    .replace(/ \/>/g, '>')
    .replace(/<input ([^>]*)>/g, (_all, attributes: string) => `<input ${attributes.replace(/=""/g, '').split(/\s+/).sort().join(' ')}>`)
    .replace(/&(#?\w+);/g, (all, name: string) => references[name] ?? all)
    .replace(/(?<=>[^<]*)>/g, '\u27e9')
    .trim()
}
