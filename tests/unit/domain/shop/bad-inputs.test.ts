// Whatever is typed into a field of a table that it cannot take: the table answers with a sentence at that field that says what it can.
import { describe, expect, it } from 'vitest'
import type { ShopInput } from '@/lib/domain/shop/shop-input'
import { SHOP_TABLES } from '@/lib/domain/shop/shop-tables'

/** A zero is refused only where the limits leave it out. */
function badFor({ kind, min = 0, unit, default: standing }: ShopInput): [what: string, sent: string | number][] {
  const empty: [string, string][] = standing === null ? [] : [['empty', ''], ['blank', '  ']]
  const words: [string, string][] = [['words', 'some'], ['a script', '<b>1</b>'], ['too long', '1'.repeat(80)]]
  if (kind === 'choice') return [...empty, ...words, ['a choice that is none', 'no such'], ['a number', -1]]
  if (kind === 'part') return [...empty, ['signs', '<>'], ['too long', 'A'.repeat(80)], ['negative', -1], ['words', 'some bolt or other']]
  if (kind === 'exact') return [...empty, ...words, ['divided by zero', '1/0'], ['two numbers', '1 2 3']]
  const zero: [string, number][] = min > 0 ? [['zero', 0]] : []
  const negative: [string, number][] = min >= 0 ? [['negative', -1]] : []
  return [...empty, ...words, ...zero, ...negative, ['absurd', 1e9], ['infinite', '1e999'], ['no number', 'NaN'], ['divided by zero', '1/0'], ['a wrong unit', `1 ${unit === 'V' ? 'in' : 'V'}`], ['another wrong unit', '3 parsec']]
}
const cases = SHOP_TABLES.flatMap((table) => table.inputs.flatMap((input) => badFor(input).map(([what, sent]) => ({ table: table.slug, input: input.name, what, sent, compute: table.compute, declared: input }))))

describe('What a table cannot take', () => {
  it.each(cases)('$table, $input: $what', ({ compute, sent, declared }) => {
    const outcome = compute({ [declared.name]: sent })
    expect(outcome.ok, JSON.stringify(outcome).slice(0, 300)).toBe(false)
    const said = outcome.ok ? undefined : outcome.errors.find(({ path }) => path === declared.name)
    // It names the field, is one sentence, and says what is allowed: a choice, an example or both ends.
    expect(said?.message).toMatch(/^\S.{10,}\.$/s)
    expect(said?.message).toMatch(/such as|choose one of|from .+ to |in figures|example|write/)
    expect(said?.message).not.toMatch(/undefined|NaN|null|Infinity/)
  })

  it.each(SHOP_TABLES)('$slug: an input it does not have', ({ compute, inputs }) => {
    const outcome = compute({ nonsense: '1' })
    expect(outcome.ok ? [] : outcome.errors).toEqual([{ path: 'nonsense', message: expect.stringContaining(inputs[0]?.name ?? '') as string }])
  })

  it.each(SHOP_TABLES)('$slug: every wrong input at once is said at once', ({ compute, inputs }) => {
    const outcome = compute(Object.fromEntries(inputs.map(({ name }) => [name, '<>'])))
    expect(outcome.ok ? [] : outcome.errors.map(({ path }) => path)).toEqual(inputs.map(({ name }) => name))
  })
})
