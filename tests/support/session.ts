// Who acts in a browser test: members of the demo by their key, people made for one test, their session cookies, and calls of the
// API in their name for arranging what a journey needs.
import { readFileSync } from 'node:fs'
import path from 'node:path'
import { createClient } from '@libsql/client'
import { encode } from 'next-auth/jwt'
import { inject } from 'vitest'
import { openDatabase } from '@/db/client'
import { member, mentorship } from '@/db/schema'
import { write } from '@/db/transaction'
import members from '@/content/demo/members.json'

/** Somebody who can sign in: key of a demo member, or e-mail of a person made by `newPerson`. */
export type Who = string

export const emailOf = (who: Who): string => members.find((m) => m.key === who)?.email ?? who
export const nameOf = (who: Who): string => members.find((m) => m.key === who)?.name ?? made.get(who) ?? who
export const markOf = (who: Who): string => members.find((m) => m.key === who)?.mentor?.number ?? ''
export const demoPassword = 'whimbrel-demo'

const made = new Map<string, string>()
const databaseFile = () => path.join(inject('server').dataDir, 'pilothole.db')

/** Runs one statement on the server's database, as another process. */
export async function sql(statement: string, args: (string | number)[] = []): Promise<Record<string, unknown>[]> {
  const client = createClient({ url: `file:${databaseFile()}`, timeout: 2_000, intMode: 'number' })
  try {
    return (await client.execute({ sql: statement, args })).rows as unknown as Record<string, unknown>[]
  } finally {
    client.close()
  }
}

export async function idOf(who: Who): Promise<number> {
  const [row] = await sql('select id from member where email = ?', [emailOf(who)])
  if (typeof row?.['id'] !== 'number') throw new Error(`Nobody is called ${who}`)
  return row['id']
}

/** A new member without a password; with `mark`, granted mentorship by the demo's steward. Returns their e-mail. */
export async function newPerson({ name, role = 'member', mark }: { name: string; role?: 'member' | 'moderator' | 'steward'; mark?: string }): Promise<Who> {
  const email = `${name.toLowerCase().replace(/[^a-z]+/g, '.')}.${Date.now().toString(36)}@pilothole.example`
  const steward = await idOf('wren')
  const database = await openDatabase(databaseFile())
  try {
    await write(database, { actorId: null, at: Date.now() }, async (tx, record) => {
      const [row] = await tx.insert(member).values({ email, name, role, createdAt: Date.now() }).returning({ id: member.id })
      if (row && mark !== undefined) await tx.insert(mentorship).values({ memberId: row.id, number: mark, fields: 'sheet metal', reason: 'Built one.', grantedBy: steward, createdAt: Date.now() })
      record('member.test', `member:${row?.id ?? 0}`)
    })
  } finally {
    database.close()
  }
  made.set(email, name)
  return email
}

/** The value of a session cookie, in next-auth's own format, as lib/auth/session-cookie.ts writes it. */
export async function sessionValue(who: Who): Promise<string> {
  const [row] = await sql('select id, session_epoch from member where email = ?', [emailOf(who)])
  if (!row) throw new Error(`Nobody is called ${who}`)
  return encode({ token: { sub: String(row['id']), epoch: row['session_epoch'] }, secret: inject('server').secret, maxAge: 3600 })
}

export const sessionCookie = 'next-auth.session-token'

interface Answer { status: number; body: any; text: string; headers: Headers } // eslint-disable-line @typescript-eslint/no-explicit-any -- a test reads what it expects to find

/** A request as the member's browser sends it from our own pages; a visitor's when `who` is null. Redirects are not followed. */
export async function call(who: Who | null, method: string, address: string, body?: unknown, { baseUrl = inject('server').baseUrl, headers = {} }: { baseUrl?: string; headers?: Record<string, string> } = {}): Promise<Answer> {
  const response = await fetch(new URL(address, baseUrl), {
    method, redirect: 'manual', ...(body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
    headers: {
      ...(who === null ? {} : { cookie: `${sessionCookie}=${await sessionValue(who)}` }), ...(method === 'GET' ? {} : { origin: baseUrl, 'sec-fetch-site': 'same-origin' }),
      ...(body === undefined ? {} : { 'content-type': 'application/json' }), ...headers,
    },
  })
  const text = await response.text()
  return { status: response.status, text, headers: response.headers, body: /json/.test(response.headers.get('content-type') ?? '') ? JSON.parse(text) : null }
}

/** The same, where anything but success is the test's own mistake. */
export async function must(who: Who | null, method: string, address: string, body?: unknown): Promise<Answer['body']> {
  const answer = await call(who, method, address, body)
  if (answer.status >= 300) throw new Error(`${method} ${address}: ${answer.status} ${answer.text.slice(0, 500)}`)
  return answer.body
}

/** Lines of `level: "error"`, and the framework's own, that the server has written since `from` (bytes). */
export function serverErrors(from: number): { lines: string[]; size: number } {
  const text = readFileSync(inject('server').errorFile)
  return { lines: text.subarray(from).toString('utf8').split('\n').filter((line) => line.includes('"level":"error"') || line.includes('⨯')), size: text.length }
}
