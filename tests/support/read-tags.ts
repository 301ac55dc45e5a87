// Reads the tags of an HTML text as the HTML standard's tokenizer does (https://html.spec.whatwg.org/multipage/parsing.html,
// states "data", "tag open", "attribute name" and "attribute value"), so that a test sees what a browser would see,
// and not what a pattern happens to match.

export interface HtmlTag { name: string; attributes: Record<string, string> }

const startTag = /<([a-zA-Z][^\s/>]*)((?:[\s/]+[^\s/>=]+(?:\s*=\s*(?:"[^"]*"|'[^']*'|[^\s>]*))?)*)[\s/]*>/g
const attribute = /([^\s/>=]+)(?:\s*=\s*(?:"([^"]*)"|'([^']*)'|([^\s>]*)))?/g

/** Every start tag in document order; names in lower case, character references in values resolved. */
export function readTags(html: string): HtmlTag[] {
  return [...html.matchAll(startTag)].map((match) => ({
    name: (match[1] ?? '').toLowerCase(),
    attributes: Object.fromEntries([...(match[2] ?? '').matchAll(attribute)].map((found) => [(found[1] ?? '').toLowerCase(), resolve(found[2] ?? found[3] ?? found[4] ?? '')])),
  }))
}

/** How many `<` begin anything but a start tag read by `readTags` or a plain end tag: comments, declarations, cut-off tags. */
export function countStrayTags(html: string): number {
  return (html.replace(startTag, '').replace(/<\/[a-z0-9]+>/g, '').match(/</g) ?? []).length
}

function resolve(value: string): string {
  return value.replace(/&(?:#x([0-9a-f]+)|#(\d+)|(\w+));?/gi, (all, hex: string | undefined, decimal: string | undefined, name: string | undefined) => {
    if (hex) return String.fromCodePoint(Number.parseInt(hex, 16))
    if (decimal) return String.fromCodePoint(Number(decimal))
    return { amp: '&', lt: '<', gt: '>', quot: '"', colon: ':' }[name ?? ''] ?? all
  })
}
