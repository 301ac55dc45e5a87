// Which questions ask for the order of two tasks, and how order advice answers them: nearest first, contrary advice beside it.
import fc from 'fast-check'
import { describe, expect, test } from 'vitest'
import { readOrderSides } from '@/lib/domain/search/order-question'
import { Synonyms } from '@/lib/domain/search/synonyms'
import { isAbout, TaskNames, type TaskName } from '@/lib/domain/search/task-names'
import type { SearchDocument } from '@/lib/search/messages'
import { aDocument, ask, idsFor, indexOf } from './corpus'

const task = (slug: string, title: string, operation: string): TaskName => ({ slug, title, operation })
const deburrEdges = task('deburr-edges', 'deburr edges', 'deburr')
const deburrHoles = task('deburr-holes', 'deburr holes', 'deburr')
const dimple = task('dimple-ribs', 'dimple ribs', 'dimple')
const prime = task('prime', 'prime parts', 'prime')
const rivet = task('rivet', 'set rivets', 'rivet')
const matchDrill = task('match-drill', 'match-drill', 'match-drill')

function namesOf(...tasks: TaskName[]): TaskNames {
  const names = new TaskNames(new Synonyms({ twoWay: [['deburr', 'deburring', 'break the edge', 'remove burrs']], oneWay: [] }))
  for (const each of tasks) names.add(each)
  return names
}
const names = namesOf(deburrEdges, deburrHoles, dimple, prime, rivet, matchDrill)
const read = (text: string) => {
  const found = names.read(text)
  return found && [[...found.one].sort().join(' '), [...found.other].sort().join(' ')]
}
const deburr = 'deburr-edges deburr-holes'

describe('a question of order', () => {
  test.each([
    ['dimple or deburr first', 'dimple-ribs', deburr], ['do I prime before riveting', 'prime', 'rivet'], ['deburr before dimpling?', deburr, 'dimple-ribs'],
    ['what comes first, deburring or dimpling', deburr, 'dimple-ribs'], ['can I rivet before priming', 'rivet', 'prime'], ['prime before or after riveting', 'prime', 'rivet'],
    ['Should the ribs be primed after dimpling?', 'prime', 'dimple-ribs'], ['priming prior to riveting', 'prime', 'rivet'], ['order of deburring and dimpling', deburr, 'dimple-ribs'],
    ['first dimple and then deburr?', 'dimple-ribs', deburr], ['deburr holes or edges deburred first', 'deburr-holes', 'deburr-edges'], ['deburr the holes or dimple first', 'deburr-holes', 'dimple-ribs'],
    ['remove burrs before dimpling', deburr, 'dimple-ribs'], ['break the edge before dimpling', 'deburr-edges', 'dimple-ribs'], ['match-drill or rivet first', 'match-drill', 'rivet'], ['which first: dimple vs deburr', 'dimple-ribs', deburr],
  ])('"%s" is between %s and %s', (text, one, other) => {
    expect(read(text)).toEqual([one, other])
  })

  test.each([
    'deburr and dimple', 'dimple or deburr', 'first rivet', 'which rivet before the spar', 'dimple dies', 'rivet first', 'before riveting', 'deburr before deburring', 'torque or paint first',
    `prime before riveting ${'and so on '.repeat(40)}`, '', 'first or last', 'the rivet after this one',
  ])('"%s" is none', (text) => {
    expect(read(text)).toBeNull()
  })

  test('a task that no advice speaks of any more is not recognised any more', () => {
    const few = namesOf(prime, rivet, rivet)
    few.remove('rivet')
    expect(few.read('prime or rivet first')).not.toBeNull()
    few.remove('rivet')
    expect(few.read('prime or rivet first')).toBeNull()
  })

  test('any text is read without an error', () => {
    fc.assert(fc.property(fc.string({ unit: 'binary', maxLength: 220 }), (text) => {
      expect(readOrderSides(`${text} or ${text} first`.slice(0, 200)).every(({ left, right }) => left.trim() !== '' && right.trim() !== '')).toBe(true)
      names.read(text)
    }))
  })

  test('advice is about a pair whichever way round', () => {
    const asked = names.read('prime or rivet first')
    if (!asked) throw new Error('not read')
    expect(isAbout({ before: 'prime', after: 'rivet' }, asked)).toBe(true)
    expect(isAbout({ before: 'rivet', after: 'prime' }, asked)).toBe(true)
    expect(isAbout({ before: 'prime', after: 'dimple-ribs' }, asked)).toBe(false)
  })
})

describe('hits of a question of order', () => {
  const text = 'On the ribs we had to dimple and to deburr every hole.'
  const advises = (id: number, before: TaskName, after: TaskName, document: Partial<SearchDocument> = {}) =>
    aDocument({ id, orderAdvice: [{ postId: id, before, after }], ...document }, text)
  const filler = Array.from({ length: 12 }, (_, i) => aDocument({ id: 100 + i, title: `Paint booth diary ${i}` }, 'Overspray settled on the bench.'))
  const proven = aDocument({ id: 1, passages: [{ postId: 1, text, weight: 1.25 }] })
  const index = indexOf(proven, advises(2, deburrHoles, dimple, { passages: [{ postId: 2, text, weight: 0.85 }] }), advises(3, prime, rivet), ...filler)

  test('order advice about the pair ranks first among equal texts, whatever speaks for the others, and is told', () => {
    expect(idsFor(index, 'dimple or deburr first')).toEqual([2, 1, 3])
    expect(ask(index, 'dimple or deburr first').hits[0]).toMatchObject({ postId: 2, advice: [{ postId: 2, before: 'deburr-holes', after: 'dimple-ribs' }] })
    expect(ask(index, 'dimple or deburr first').hits[2]).not.toHaveProperty('advice')
  })

  test('a misspelt one as well', () => {
    expect(ask(index, 'dimple or debur first').hits[0]).toMatchObject({ id: 2, advice: [{ before: 'deburr-holes' }] })
  })

  test('the same words without asking for an order rank as ever', () => {
    expect(idsFor(index, 'dimple deburr')).toEqual([1, 3, 2])
    expect(ask(index, 'dimple deburr').hits.some((hit) => 'advice' in hit)).toBe(false)
  })

  test('contrary advice is shown as well, each in its own hit or side by side in one', () => {
    const contrary = indexOf(proven, advises(2, deburrHoles, dimple), advises(3, dimple, deburrHoles), aDocument({
      id: 4, kind: 'question', passages: [{ postId: 4, text, weight: 1 }, { postId: 41, text: 'Deburr.', weight: 1 }, { postId: 42, text: 'Dimple.', weight: 1 }],
      orderAdvice: [{ postId: 41, before: deburrHoles, after: dimple }, { postId: 42, before: dimple, after: deburrHoles }],
    }), ...filler)
    const { hits } = ask(contrary, 'dimple or deburr first')
    expect(hits.at(-1)?.id).toBe(1)
    expect(hits.find((hit) => hit.id === 3)?.advice).toMatchObject([{ before: 'dimple-ribs', after: 'deburr-holes' }])
    expect(hits.find((hit) => hit.id === 4)?.advice).toHaveLength(2)
  })

  test('advice that was edited away or taken out no longer ranks', () => {
    const changed = indexOf(proven, advises(2, deburrHoles, dimple), ...filler)
    changed.put(aDocument({ id: 2 }, text))
    expect(idsFor(changed, 'dimple or deburr first')).toEqual([1, 2])
    expect(ask(changed, 'dimple or deburr first').hits.some((hit) => 'advice' in hit)).toBe(false)
  })
})
