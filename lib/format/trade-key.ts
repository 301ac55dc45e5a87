// The trade keys of the phone's search line, and what pressing one does to the text. The keys themselves are components/search/trade-keys.tsx.

export interface TradeKey {
  /** What is put in. */
  text: string
  /** What a screen reader says, where the text alone is not a word. */
  name?: string
}

/** Two rows of sizes, those that rivets, bolts and grommets come in, then what the letters' keyboard hides or takes long to type. */
export const SIZE_KEYS: readonly TradeKey[] = ['1/16', '3/32', '1/8', '5/32', '3/16', '1/4', '5/16', '3/8', '7/16', '1/2', '5/8', '3/4'].map((text) => ({ text }))
export const WORD_KEYS: readonly TradeKey[] = [{ text: '#', name: 'number sign' }, { text: '-', name: 'dash' }, { text: 'AN' }, { text: 'mm' }, { text: 'drill' }, { text: 'rivet' }, { text: 'torque' }]

export interface Typed { value: string; caret: number }

/**
 * The text after a key was pressed where `start` to `end` is selected. A dash joins; everything else stands apart from what is before
 * it, but for what follows a # or a dash. A word gets its space behind it.
 */
export function typeTradeKey(value: string, start: number, end: number, key: string): Typed {
  const [before, after] = [value.slice(0, start), value.slice(end)]
  const apart = key !== '-' && before !== '' && !/[\s#-]$/.test(before) ? ' ' : ''
  const behind = /^[a-z]{3,}$/.test(key) && !after.startsWith(' ') ? ' ' : ''
  const put = `${apart}${key}${behind}`
  return { value: `${before}${put}${after}`, caret: before.length + put.length }
}
