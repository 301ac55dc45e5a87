// What the desk's address says: which sheet is open, and what the rail is narrowed to. Anything odd in it counts for nothing.

export interface DeskAddress { open?: number; operation?: string; section?: string }

/** `open` is a post's id, 0 for none; `section` reads kit:code. */
export function readDeskAddress(query: Record<string, string | string[] | undefined>): DeskAddress {
  const text = (name: string, pattern: RegExp) => {
    const value = query[name]
    return typeof value === 'string' && pattern.test(value) ? value : undefined
  }
  const open = text('open', /^[0-9]{1,15}$/)
  const operation = text('operation', /^[a-z0-9-]{1,60}$/)
  const section = text('section', /^[a-z0-9-]{1,60}:[A-Za-z0-9.-]{1,12}$/)
  return { ...(open !== undefined ? { open: Number(open) } : {}), ...(operation !== undefined ? { operation } : {}), ...(section !== undefined ? { section } : {}) }
}
