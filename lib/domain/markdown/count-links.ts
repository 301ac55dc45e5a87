// Counts what a Markdown parser with GFM could turn into links: too high rather than too low (code spans and
// fences count too, a mailbox in a link twice), but a link whose text is its own web address counts once.

const definition = /^[ \t>]*\[([^[\]\n]{1,999})\]:/gm
// Between two brackets there is no third, so each stretch of text is looked at once.
const bracketed = /\[([^[\]\n]{1,999})\](?!\()/g
const address = /(?:https?:\/\/|ftp:\/\/|www\.)/gi
const otherScheme = /<(?!https?:|ftp:)[a-z][a-z0-9+.-]{1,31}:/gi
const mailbox = /[a-z0-9._+-]@[a-z0-9]/gi

const labelKey = (label: string): string => label.trim().replace(/\s+/g, ' ').toLowerCase()

/** How many links (inline, by reference, images, bare addresses and mailboxes) `text` can hold at most. */
export function countLinks(text: string): number {
  const labels = new Set<string>()
  for (const match of text.matchAll(definition)) labels.add(labelKey(match[1] ?? ''))
  let links = countOf(text, /\]\(/g)
  // A definition is its own first bracket, so that many definitions count without a reference.
  if (labels.size > 0) {
    for (const match of text.matchAll(bracketed)) if (labels.has(labelKey(match[1] ?? ''))) links += 1
  }
  return links + bareAddresses(text)
}

/** Characters in the longest stretch without a space that holds a web address; 0 when there is none. */
export function longestAddress(text: string): number {
  let longest = 0
  for (const word of text.split(/\s+/)) {
    if (word.length > longest && /:\/\/|www\./i.test(word)) longest = word.length
  }
  return longest
}

function countOf(text: string, pattern: RegExp): number {
  return [...text.matchAll(pattern)].length
}

/** Addresses that are not the target or the definition of a link counted already, nor its text. */
function bareAddresses(text: string): number {
  let bare = countOf(text, otherScheme) + countOf(text, mailbox)
  for (const match of text.matchAll(address)) {
    const before = text.slice(Math.max(0, match.index - 3), match.index)
    // In `https://www.` the second half begins no second link.
    if (/(\]\(<?|\]: ?|\[|\/\/)$/.test(before)) continue
    bare += 1
  }
  return bare
}
