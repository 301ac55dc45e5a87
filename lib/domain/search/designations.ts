// Numbers and designations as people write them, brought to one spelling: fractions, decimals, drills, AN/MS/NAS hardware,
// plans pages. Words are analyse-text.ts; equal values in other units are not known here.

/** One spelling, and broader ones that also find it (an470ad4-6 is also an470ad4, an470 and ad4). */
export interface Spelling { term: string; also: string[] }

const units = 'mm|cm|m|km|in|inch|inches|ft|feet|lb|lbs|kg|g|oz|psi|bar|kpa|pa|nm|v|a|ah|w|kw|hp|hz|khz|mhz|kt|kts|mph|rpm|cfm|f|c|deg|thou|mil|mils|gal|gph|l|ml|h|hr|hrs|min|s|sec'
const numberWithUnit = new RegExp(`^((?:\\d+-)?\\d+/\\d+|\\d*\\.?\\d+)(${units})$`)

/** Units say too little to be searched for by themselves; a number keeps its meaning without. */
export const isUnit = (word: string): boolean => unitWords.has(word)
const unitWords = new Set(`${units}|in-lb|ft-lb|nm`.split('|').filter((unit) => unit.length > 1))

/**
 * AN, MS, NAS written apart ("AN 470 AD 4-6"), in text of any case. Small-case "an" is an article, so it needs three digits.
 * Drill numbers in words ("number 30 drill", "No. 30").
 */
const apart = /(?<![\p{L}\p{N}])(?:(AN|MS|NASM|NAS)[ -](\d{1,6})|(an|An|ms|nasm|nas)[ -](\d{3,6}))(?:[ -]?(AD|DD|ad|dd)[ -]?(\d{1,2})(?:[ -](\d{1,3}))?(?![\p{L}\p{N}]))?/gu
const drillInWords = /(?<![\p{L}\p{N}])(?:number|no\.?|nr\.?|num)[ ]?(\d{1,2})(?![\p{L}\p{N}./])/giu

export interface Found { start: number; end: number; spelling: Spelling }

/** Designations that hold spaces, ascending. They stand beside the tokens of their pieces, not instead of them. */
export function findSpacedDesignations(text: string): Found[] {
  const found: Found[] = []
  for (const match of text.matchAll(apart)) {
    const head = `${match[1] ?? match[3] ?? ''}${match[2] ?? match[4] ?? ''}`
    const size = match[5] ? `${match[5]}${match[6] ?? ''}${match[7] ? `-${match[7]}` : ''}` : ''
    found.push({ start: match.index, end: match.index + match[0].length, spelling: spellDesignation((head + size).toLowerCase()) })
  }
  for (const match of text.matchAll(drillInWords)) {
    found.push({ start: match.index, end: match.index + match[0].length, spelling: { term: `#${Number(match[1])}`, also: [] } })
  }
  return found.sort((a, b) => a.start - b.start)
}

/** A plans page and its step in one: w3-2/6. A page begins with a letter here, because 1-1/16 is a length. */
const pageAndStep = /^([a-z]{1,3}\d{1,3}-\d{1,3}[a-z]?)\/(\d{1,3}[a-z]?)$/

/** Spellings of a chunk that holds a digit, lower case: one, or two when a unit is stuck on ("18mm") or a step ("W3-2/6"). */
export function spellChunk(chunk: string): Spelling[] {
  const drill = /^#(\d{1,3})(?:-(\d{1,3}))?$/.exec(chunk)
  if (drill) return [drill[2] ? { term: `${Number(drill[1])}-${drill[2]}`, also: [`#${Number(drill[1])}`] } : { term: `#${Number(drill[1])}`, also: [] }]
  const bare = chunk.replaceAll('#', '')
  const stuck = numberWithUnit.exec(bare)
  if (stuck) return [spellNumber(stuck[1] ?? ''), { term: stuck[2] ?? '', also: [] }]
  const slashed = pageAndStep.exec(bare)
  if (slashed) return [spellDesignation(slashed[1] ?? ''), { term: slashed[2] ?? '', also: [`step${slashed[2] ?? ''}`] }]
  return [/^[\d.,/-]+$/.test(bare) ? spellNumber(bare) : spellDesignation(bare)]
}

/** 0.1250 and .125 are one, 1,420 is 1420, 3/8 is also .375; a range, thread or mixed number is also its parts. */
function spellNumber(chunk: string): Spelling {
  const plain = chunk.replace(/(\d),(?=\d{3}(?!\d))/g, '$1').replace(/,/g, '.')
  const parts = plain.split('-').filter((part) => part !== '')
  const [whole, fraction] = parts
  if (parts.length === 2 && whole && fraction && /^\d+$/.test(whole) && /^\d+\/\d+$/.test(fraction)) {
    return { term: `${whole}-${fraction}`, also: decimalOf(fraction, Number(whole)) }
  }
  const also = parts.length > 1 ? parts.map(oneNumber) : decimalOf(plain, 0)
  return { term: parts.map(oneNumber).join('-'), also }
}

function oneNumber(text: string): string {
  if (!/^\d*\.\d+$/.test(text)) return text.replace(/^0+(?=\d)/, '')
  const trimmed = text.replace(/0+$/, '').replace(/\.$/, '').replace(/^0+(?=[\d.])/, '')
  return trimmed === '' || trimmed === '.' ? '0' : trimmed
}

function decimalOf(text: string, whole: number): string[] {
  const match = /^(\d{1,3})\/(\d{1,3})$/.exec(text)
  const value = match ? whole + Number(match[1]) / Number(match[2]) : NaN
  if (!Number.isFinite(value) || value <= 0) return []
  const written = value.toFixed(6)
  // Only what the decimals say exactly: 1/3 has none.
  return Number(written) === value ? [oneNumber(written)] : []
}

/** an470ad4-6 → an470ad4, an470, ad4; w3-2 → w3; w-3 is w3; 2024-t3 → 2024, t3. */
function spellDesignation(chunk: string): Spelling {
  const compact = chunk.replace(/^([a-z]+)-(?=\d)/, '$1').replace(/[./·]+/g, '-')
  const parts = compact.split('-').filter((part) => part !== '')
  const [head = ''] = parts
  const also = new Set<string>()
  if (parts.length > 1) {
    also.add(head)
    for (const part of parts.slice(1)) if (/[a-z]/.test(part) && part.length > 1) also.add(part)
  }
  const sized = /^([a-z]{1,5}\d{2,6})([a-z]{1,2}\d{1,3})[a-z]?$/.exec(head)
  if (sized?.[1] && sized[2]) also.add(sized[1]).add(sized[2])
  const term = parts.join('-')
  also.delete(term)
  return { term, also: [...also] }
}
