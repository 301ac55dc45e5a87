// What people send about themselves: e-mails in one case, passwords of some length, and return addresses that stay with us.
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { signUpSchema, sitePath } from '@/lib/schemas/people'

describe('where one goes after signing in', () => {
  it.each(['/desk?open=3&operation=seal', '/entries/12#post-14', '/', '/search?q=grommet%20hole'])('stays on the way to %s', (path) => {
    expect(sitePath(path)).toBe(path)
  })

  it.each([
    '', 'desk', 'https://elsewhere.example/', '//elsewhere.example', '/\\elsewhere.example', '/..//elsewhere.example', '/.//elsewhere.example', '/\t/elsewhere.example',
    '/a\r\nLocation: x', 'javascript:alert(1)', '/sign-in', '/sign-in?from=/sign-in', '/sign-up', '/api/entries',
  ])('never goes to %j', (path) => {
    expect(sitePath(path)).toBeNull()
  })

  it('whatever is sent, a browser resolves it to this site', () => {
    const pieces = fc.array(fc.constantFrom('/', '//', '\\', '.', '..', '%2f', ':', '@', 'http:', 'elsewhere.example', '\t', '\n', ' ', '?', '#', 'desk'), { maxLength: 8 }).map((p) => p.join(''))
    fc.assert(fc.property(pieces, (text) => {
      const path = sitePath(text)
      if (path !== null) expect(new URL(path, 'https://pilothole.example').origin).toBe('https://pilothole.example')
    }), { numRuns: 2_000 })
  })
})

describe('signing up', () => {
  const typed = { name: '  Dela   Whitcombe ', email: ' Dela@Pilothole.EXAMPLE ', password: 'ten of them', from: '' }

  it('keeps the e-mail in lower case and the name on one line', () => {
    expect(signUpSchema.parse(typed)).toEqual({ name: 'Dela Whitcombe', email: 'dela@pilothole.example', password: 'ten of them', from: null })
  })

  it.each([['a password of nine characters', { password: 'nine char' }, 'password'], ['something that is no e-mail', { email: 'dela at home' }, 'email'], ['an empty name', { name: ' ' }, 'name'], ['a role of one’s own choice', { role: 'steward' }, '']])('refuses %s', (_what, over, path) => {
    const result = signUpSchema.safeParse({ ...typed, ...over })
    expect(result.error?.issues.map((i) => i.path.join('.'))).toEqual([path])
  })
})
