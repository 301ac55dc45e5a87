// The bolt table: length and grip for a thickness, washers, threads showing, and what a wrong choice looks like.
import { BOLTS, decodeBolt } from './bolt-designation'
import { boltFacts, lengthResults } from './bolt-results'
import { defineTable } from './shop-table'

export const boltTable = defineTable({
  slug: 'bolt',
  title: 'Bolt grip and length',
  inputs: [
    { name: 'bolt', label: 'Bolt', unit: '', kind: 'choice', options: BOLTS.map((bolt) => ({ value: bolt, label: bolt })), default: 'AN3' },
    { name: 'thickness', label: 'Thickness clamped, without washers', unit: 'in', kind: 'length', min: 0.01, max: 4, default: '1/4' },
    { name: 'washers', label: 'Washers, all together', unit: '', kind: 'number', min: 0, max: 8, default: '1' },
    { name: 'washer', label: 'Thickness of one washer', unit: 'in', kind: 'length', min: 0.005, max: 0.25, default: '1/16', hint: 'measure one' },
    { name: 'nut', label: 'Height of the nut', unit: 'in', kind: 'length', min: 0.05, max: 2, default: null, hint: 'measure the nut in hand' },
    { name: 'part', label: 'Bolt in hand', unit: '', kind: 'part', default: null, hint: 'such as AN3-5A' },
  ],
  results: [
    { name: 'bolt', label: 'Bolt for this thickness', unit: '' }, { name: 'length', label: 'Length', unit: 'in' }, { name: 'grip', label: 'Grip', unit: 'in' },
    { name: 'shank-past', label: 'Shank past the stack', unit: 'in' }, { name: 'threads-showing', label: 'Threads past the nut', unit: 'threads' },
    { name: 'threads-showing-least', label: 'Threads past the nut, at least', unit: 'threads' }, { name: 'threads-in-hole-most', label: 'Threads in the hole, at most', unit: 'threads' },
    { name: 'one-shorter', label: 'One shorter', unit: '' }, { name: 'one-longer', label: 'One longer', unit: '' }, { name: 'in-hand', label: 'Bolt in hand', unit: '' },
    { name: 'part', label: 'Designation reads', unit: '' }, { name: 'part-length', label: 'Bolt in hand, length', unit: 'in' }, { name: 'part-grip', label: 'Bolt in hand, grip', unit: 'in' },
    { name: 'grip-rule', label: 'Rule for the grip', unit: '' }, { name: 'thread', label: 'Thread', unit: '' }, { name: 'hole', label: 'Hole', unit: 'in' }, { name: 'clearance-hole', label: 'Clearance hole', unit: 'in' },
    { name: 'drive-fit', label: 'Light drive fit, interference', unit: 'in' }, { name: 'head-mark', label: 'Head marks', unit: '' }, { name: 'least-primary', label: 'Smallest in primary structure', unit: '' },
  ],
  cautions: ['structure', 'flight-controls'],
  check(given) {
    const part = given.optionalWord('part')
    const decoded = part === undefined ? null : decodeBolt(part)
    const errors = []
    if (!Number.isInteger(given.number('washers'))) errors.push({ path: 'washers', message: 'Washers, all together: a whole number from 0 to 8.' })
    if (part !== undefined && !decoded) errors.push({ path: 'part', message: 'Bolt in hand: write a designation such as AN3-5A, AN4H-12 or AN5DD-7A. Lengths are known for AN3 and AN4 from -4, AN5 and AN6 from -5, up to -27.' })
    else if (decoded && decoded.bolt !== given.word('bolt')) errors.push({ path: 'part', message: `Bolt in hand: this is an ${decoded.bolt}, but the bolt chosen is ${given.word('bolt')}. Change one of them.` })
    return errors
  },
  work: (given) => [...lengthResults(given), ...boltFacts(given.word('bolt'))],
})
