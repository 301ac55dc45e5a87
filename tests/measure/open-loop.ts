// Requests at a fixed rate, whatever the answers do: the way people come. Time counts from when a request was due,
// so that a server that stands still is not excused by requests that were never sent.
import http from 'node:http'
import { spreadOf, type Spread } from './percentiles'

export interface LoopResult extends Spread { errors: string[]; secondsTaken: number; bytesMedian: number }

interface Answer { status: number; bytes: number }

/** Sends `paths` to `address`, `rate` a second, one after the other in their order. Milliseconds to the last byte. */
export async function openLoop(address: string, paths: readonly string[], rate: number, headers: Record<string, string> = {}): Promise<LoopResult> {
  const agent = new http.Agent({ keepAlive: true, maxSockets: 200 })
  const begun = performance.now()
  const taken: number[] = []
  const bytes: number[] = []
  const errors: string[] = []
  await Promise.all(paths.map(async (path, i) => {
    const due = begun + (i * 1000) / rate
    await new Promise((resolve) => setTimeout(resolve, due - performance.now()))
    try {
      const answer = await get(`${address}${path}`, agent, headers)
      taken.push(performance.now() - due)
      bytes.push(answer.bytes)
      if (answer.status !== 200) errors.push(`${answer.status} ${path}`)
    } catch (error) {
      errors.push(`${String(error)} ${path}`)
    }
  }))
  agent.destroy()
  return { ...spreadOf(taken), errors, secondsTaken: Math.round((performance.now() - begun) / 100) / 10, bytesMedian: spreadOf(bytes).p50 }
}

function get(url: string, agent: http.Agent, headers: Record<string, string>): Promise<Answer> {
  return new Promise((resolve, reject) => {
    // Compressed, as a browser asks for it: packing is part of the answer's time.
    const request = http.get(url, { agent, headers: { 'accept-encoding': 'gzip', ...headers }, timeout: 30_000 }, (response) => {
      let bytes = 0
      response.on('data', (piece: Buffer) => { bytes += piece.length })
      response.on('end', () => resolve({ status: response.statusCode ?? 0, bytes }))
      response.on('error', reject)
    })
    request.on('timeout', () => request.destroy(new Error('no answer in 30 s')))
    request.on('error', reject)
  })
}
