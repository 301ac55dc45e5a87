// The torque table: nut and bolt torque, drag of locking nuts, castle nuts, and the wrench with an extension.
import data from '@/content/shop/torque.json'
import { defineTable } from './shop-table'
import { nutTorque, locking, wrench } from './torque-results'
import { TORQUE_THREADS } from './torque-rules'
import { boltOfThread } from './bolt-designation'

export const torqueTable = defineTable({
  slug: 'torque',
  title: 'Torque',
  inputs: [
    { name: 'thread', label: 'Thread', unit: '', kind: 'choice', default: '10-32', options: TORQUE_THREADS.map((thread) => {
      const bolt = boltOfThread(thread)
      return { value: thread, label: bolt ? `${thread} (${bolt})` : thread, ...(bolt ? { aliases: [bolt] } : {}) }
    }) },
    { name: 'nut', label: 'Nut', unit: '', kind: 'choice', default: 'tension', options: [
      { value: 'tension', label: 'Tension: MS20365, AN310', aliases: ['AN310', 'AN365', 'MS20365'] }, { value: 'shear', label: 'Shear: MS20364, AN320', aliases: ['AN320', 'AN364', 'MS20364'] },
    ] },
    { name: 'drag', label: 'Drag of the nut, measured', unit: 'lbf-in', kind: 'torque', min: 0, max: 500, default: null, hint: 'turn the nut down to just before it seats and read the wrench' },
    { name: 'target', label: 'Torque the plans name', unit: 'lbf-in', kind: 'torque', min: 0.1, max: 20000, default: null },
    { name: 'lever', label: 'Lever of the wrench', unit: 'in', kind: 'length', min: 1, max: 60, default: null, hint: 'middle of the drive to the middle of the grip' },
    { name: 'extension', label: 'Extension', unit: 'in', kind: 'length', min: 0.1, max: 60, default: null, hint: 'middle of the drive to the middle of the nut' },
    { name: 'direction', label: 'Extension points', unit: '', kind: 'choice', default: 'longer', options: [
      { value: 'longer', label: 'straight on, lever longer' }, { value: 'shorter', label: 'back, lever shorter' }, { value: 'square', label: 'square, at 90 degrees' },
    ] },
    { name: 'reading', label: 'The wrench reads', unit: 'lbf-in', kind: 'torque', min: 0.1, max: 20000, default: null },
  ],
  results: [
    { name: 'torque', label: 'Torque', unit: 'lbf-in' }, { name: 'most', label: 'Never over', unit: 'lbf-in' }, { name: 'with-drag', label: 'Wrench, with the drag', unit: 'lbf-in' },
    { name: 'castle-start', label: 'Castle nut: start at', unit: 'lbf-in' }, { name: 'castle-limit', label: 'Castle nut: never exceed', unit: 'lbf-in' },
    { name: 'prevailing', label: 'Reused locking nut: drag at least', unit: 'lbf-in' }, { name: 'finger-test', label: 'Finger test', unit: '' }, { name: 'heat', label: 'Not above', unit: '°F' },
    { name: 'wrench', label: 'Set the wrench to', unit: 'lbf-in' }, { name: 'at-nut', label: 'Arrives at the nut', unit: 'lbf-in' }, { name: 'calibration', label: 'Wrench calibration', unit: 'per year' },
  ],
  cautions: ['structure', 'flight-controls', 'powerplant'],
  check(given) {
    const [lever, extension] = [given.optionalNumber('lever'), given.optionalNumber('extension')]
    if (extension !== undefined && lever === undefined) return [{ path: 'lever', message: 'Lever of the wrench: give it too, from 1 in to 60 in; an extension means nothing without it.' }]
    if (given.optionalNumber('reading') !== undefined && lever === undefined) return [{ path: 'lever', message: 'Lever of the wrench: give it too, from 1 in to 60 in, to turn a reading into torque at the nut.' }]
    if (lever !== undefined && extension !== undefined && given.word('direction') === 'shorter' && extension > lever / 2) {
      return [{ path: 'extension', message: `Extension: pointing back it may take up to half the lever, ${(lever / 2).toFixed(2)} in here; beyond that the reading runs away.` }]
    }
    return []
  },
  work: (given) => [...nutTorque(given), ...locking(given.word('thread')), ...wrench(given)],
})

/** The conditions Table 7-1 holds for. */
export const TORQUE_CONDITION = data.table.condition
