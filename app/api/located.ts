// Where a thing that was just made can be read. Part of the API handlers only.

/** A Location header: the entry it belongs to, with a fragment that names the thing when it is not the entry itself. */
export const located = (entryId: number, fragment?: string): Record<string, string> => ({ location: `/api/entries/${entryId}${fragment ? `#${fragment}` : ''}` })
