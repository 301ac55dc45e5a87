// The stamp form: each basis asks for its own fields, and they become the reference that stands on the stamp.
import { describe, expect, it } from 'vitest'
import { stampFormSchema } from '@/lib/schemas/stamp-form'

const blank = {
  postId: '128', revision: 'B', basis: '', page: '', step: '', plansRevision: '', beforeMe: false, edition: '', paragraph: '', build: '', builtWhen: '', replyDate: '', scope: '',
}
const faults = (over: Partial<typeof blank>) => stampFormSchema.safeParse({ ...blank, ...over }).error?.issues.map((i) => i.path.join('.')) ?? []

describe('what is filled in becomes a stamp', () => {
  it.each([
    [{ basis: 'plans', page: 'W3-2', step: '6', plansRevision: 'C', beforeMe: true }, { basis: 'plans', reference: 'W3-2 step 6', plansRevision: 'C' }],
    [{ basis: 'standard', edition: 'AC 43.13-1B', paragraph: '4-57' }, { basis: 'standard', reference: 'AC 43.13-1B para 4-57' }],
    [{ basis: 'own-build', build: 'Whimbrel 2', builtWhen: 'winter 2024' }, { basis: 'own-build', reference: 'Whimbrel 2, winter 2024' }],
    [{ basis: 'maker-reply', replyDate: '2026-03-02', scope: 'all-kits' }, { basis: 'maker-reply', reference: 'reply of 2 March 2026', scope: 'all-kits' }],
  ])('%j', (over, stamp) => {
    expect(stampFormSchema.parse({ ...blank, ...over })).toEqual({ postId: 128, stamp: { revision: 'B', ...stamp } })
  })

  it('fields of a basis that was not chosen are left aside', () => {
    const { stamp } = stampFormSchema.parse({ ...blank, basis: 'standard', edition: 'MIL-HDBK-5J', paragraph: '8.1', page: 'W3-2', plansRevision: 'C', scope: 'all-kits' })
    expect(stamp).toEqual({ revision: 'B', basis: 'standard', reference: 'MIL-HDBK-5J para 8.1' })
  })
})

describe('what is missing is named beside its field', () => {
  it.each([
    [{}, ['basis']],
    [{ basis: 'imported' }, ['basis']],
    [{ basis: 'plans' }, ['beforeMe', 'page', 'step', 'plansRevision']],
    [{ basis: 'standard' }, ['edition', 'paragraph']],
    [{ basis: 'own-build', build: 'Whimbrel 2' }, ['builtWhen']],
    [{ basis: 'maker-reply', replyDate: 'in March', scope: 'bulletin' }, ['replyDate']],
    [{ basis: 'own-build', build: 'x'.repeat(400), builtWhen: '2024' }, ['build']],
    [{ basis: 'standard', edition: 'A', paragraph: '1', revision: 'b' }, ['revision']],
  ])('%j', (over, paths) => {
    expect(faults(over)).toEqual(paths)
  })

  it('a reply for one serial cannot be stamped', () => {
    expect(faults({ basis: 'maker-reply', replyDate: '2026-03-02', scope: 'one-serial' })).toEqual(['scope'])
  })

  it('a plans step without its page before the mentor is no basis', () => {
    expect(faults({ basis: 'plans', page: 'W3-2', step: '6', plansRevision: 'C' })).toEqual(['beforeMe'])
  })
})
