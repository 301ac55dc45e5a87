// A burst of writes over HTTP, from several people at once, until the server is gone. Keeps what was acknowledged and nothing else.
import { cautionTable } from '@/lib/content/caution-table'
import type { Chance } from './seeded-random'

export interface Acknowledged {
  /** `word` stands in the text and nowhere else, so that search can be asked for it. */
  entries: { id: number; title: string; word: string }[]
  answers: { id: number; entryId: number; body: string; word: string }[]
  remarks: { id: number; body: string }[]
}
export interface Burst {
  acknowledged: Acknowledged
  refused: string[]
  /** Resolves with the first acknowledgement: from then on the burst is under way. Or with `done`, when nothing was acknowledged. */
  begun: Promise<void>
  done: Promise<void>
}

const acknowledgedCautions = cautionTable.cautions.map((caution) => caution.code)

/** Starts `writers` people; each writes an entry, an answer and a remark in turn until a request fails because nobody answers. */
export function startBurst(address: string, token: string, writers: number, chance: Chance): Burst {
  const acknowledged: Acknowledged = { entries: [], answers: [], remarks: [] }
  const refused: string[] = []
  const post = (path: string, body: object) => send(`${address}${path}`, token, body, refused)
  let tellBegun = () => {}
  const first = new Promise<void>((resolve) => { tellBegun = resolve })
  const write = async () => {
    for (;;) {
      const word = unusualWord(chance)
      const title = `Where the ${word} placard goes`
      const id = await post('/api/entries', { kind: 'question', kit: 'whimbrel-2', sections: ['X-1'], tasks: [], hardware: [], title, parts: { doing: 'Putting placards on.' }, acknowledgedCautions })
      if (id === null) return
      acknowledged.entries.push({ id, title, word })
      tellBegun()
      const answer = { word: unusualWord(chance), id: 0, entryId: id, body: '' }
      answer.body = `On the panel, left of the ${answer.word}.`
      const answerId = await post(`/api/entries/${id}/answers`, { body: answer.body, acknowledgedCautions })
      if (answerId === null) return
      acknowledged.answers.push({ ...answer, id: answerId })
      const remark = `Mine went under the ${word}.`
      const remarkId = await post(`/api/posts/${id}/remarks`, { body: remark })
      if (remarkId === null) return
      acknowledged.remarks.push({ id: remarkId, body: remark })
    }
  }
  const done = Promise.all(Array.from({ length: writers }, write)).then(() => undefined)
  return { acknowledged, refused, begun: Promise.race([first, done]), done }
}

/** The id that was acknowledged with 201, or null when the server is gone. A refusal by a living server is noted. */
async function send(url: string, token: string, body: object, refused: string[]): Promise<number | null> {
  try {
    const response = await fetch(url, { method: 'POST', headers: { authorization: `Bearer ${token}`, 'content-type': 'application/json' }, body: JSON.stringify(body) })
    const text = await response.text()
    if (response.status === 201) return Number(JSON.parse(text).id)
    refused.push(`${response.status} ${text.slice(0, 300)}`)
    return null
  } catch {
    return null
  }
}

/** Twelve letters that make no word and lie far from each other. */
const unusualWord = (chance: Chance): string => Array.from({ length: 6 }, () => `${chance.pick([...'bcdfghjklmnpqrtvwxz'])}${chance.pick([...'aeiou'])}`).join('')
