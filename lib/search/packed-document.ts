// An entry as the index keeps it: what filters and orders as it is, its texts as bytes outside the heap, read only when a passage is picked.
// As strings the texts of 100,000 entries take twice the room, all of it walked over by every collection.
import 'server-only'
import type { SearchDocument } from './messages'

export interface PackedDocument extends Omit<SearchDocument, 'labels' | 'passages'> {
  /** `bytes`: how many of `texts` are this passage's. */
  readonly passages: readonly { postId: number; weight: number; bytes: number }[]
  /** UTF-8: the passages one after the other, then the labels. */
  readonly texts: Uint8Array
}

const decoder = new TextDecoder()

export function packDocument({ labels, passages, ...document }: SearchDocument): PackedDocument {
  const texts = passages.map(({ text }) => Buffer.from(text))
  return shareLists({
    ...document,
    passages: passages.map(({ postId, weight }, i) => ({ postId, weight, bytes: texts[i]?.length ?? 0 })),
    // A buffer of its own: pooled ones would keep their neighbours alive.
    texts: new Uint8Array(Buffer.concat([...texts, Buffer.from(labels)])),
  })
}

export function unpackDocument({ texts, passages, ...document }: PackedDocument): SearchDocument {
  let at = 0
  const read = (bytes: number) => decoder.decode(texts.subarray(at, (at += bytes)))
  const unpacked = passages.map(({ postId, weight, bytes }) => ({ postId, weight, text: read(bytes) }))
  return { ...document, passages: unpacked, labels: read(texts.length - at) }
}

/** Slugs seen before, as lists and alone: entries name the same few hundred. */
const lists = new Map<string, string[]>()
const slugs = new Map<string, string>()
const mostShared = 20_000

/** The same entry with lists and slugs that it shares with others. */
export function shareLists(document: PackedDocument): PackedDocument {
  return { ...document, kit: shared(slugs, document.kit, document.kit), sections: sharedList(document.sections), operations: sharedList(document.operations), tasks: sharedList(document.tasks) }
}

const sharedList = (list: string[]): string[] => shared(lists, list.join('\n'), list)

function shared<T>(known: Map<string, T>, key: string, value: T): T {
  const seen = known.get(key)
  if (seen !== undefined) return seen
  if (known.size >= mostShared) known.clear()
  known.set(key, value)
  return value
}
