// kill -9 in the middle of a burst of writes, twice, against the production build. `npm run bench -- kill` does it longer.
import { expect, it } from 'vitest'
import { measureKill } from '../measure/kill-nine'

it('keeps every acknowledged write through kill -9: there, found by search, the file sound, the audit chain whole', async () => {
  const seed = Date.now() % 1_000_000
  const { measured } = await measureKill({ rounds: 2, writers: 10, seed })
  expect(measured.filter(({ promised, value }) => promised !== null && value > promised), `seed ${seed}`).toEqual([])
  expect(measured[0]).toMatchObject({ what: expect.stringContaining('acknowledged'), value: expect.any(Number) })
  expect(measured[0]?.value).toBeGreaterThan(0)
})
