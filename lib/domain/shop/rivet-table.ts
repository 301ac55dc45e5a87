// The rivet table: what a given rivet asks of hole, length, shop head, edge and pitch, each with its source. Rules are rivet-rules.ts.
import { inchesOf } from './exact-fraction'
import { edgeAndPitch } from './rivet-layout'
import { alloyWords, partWords, rivetBody } from './rivet-body'
import { RIVET_DIAMETERS } from './rivet-rules'
import { decodeRivet } from './rivet-designation'
import { defineTable } from './shop-table'

export const rivetTable = defineTable({
  slug: 'rivet',
  title: 'Rivet and hole',
  inputs: [
    { name: 'diameter', label: 'Rivet diameter', unit: 'in', kind: 'choice', options: RIVET_DIAMETERS.map((size) => ({ value: size, label: `${size} in`, aliases: [`-${inchesOf(size) * 32}`, String(inchesOf(size))] })), default: '1/8' },
    { name: 'head', label: 'Head', unit: '', kind: 'choice', default: 'universal', options: [
      { value: 'universal', label: 'Universal AN470', aliases: ['AN470', 'MS20470', 'protruding'] }, { value: 'flush', label: 'Flush AN426', aliases: ['AN426', 'MS20426', 'countersunk'] },
      { value: 'blind', label: 'Blind, pull-stem', aliases: ['pull', 'pop'] },
    ] },
    { name: 'alloy', label: 'Alloy', unit: '', kind: 'choice', default: 'AD', options: [
      { value: 'AD', label: 'AD, 2117-T4', aliases: ['2117'] }, { value: 'A', label: 'A, 1100-F', aliases: ['1100'] }, { value: '2017', label: '2017', aliases: ['D'] },
      { value: '2024', label: '2024', aliases: ['DD'] }, { value: '7050', label: '7050' },
    ] },
    { name: 'stack', label: 'Grip: all sheets together', unit: 'in', kind: 'length', min: 0.01, max: 3, default: '0.065', hint: 'the thicknesses added up' },
    { name: 'sheet', label: 'Thickest sheet', unit: 'in', kind: 'length', min: 0.01, max: 1, default: null },
    { name: 'edge', label: 'Edge distance you have', unit: 'in', kind: 'length', min: 0.01, max: 6, default: null, hint: 'centre of the hole to the edge' },
    { name: 'pitch', label: 'Pitch you have', unit: 'in', kind: 'length', min: 0.05, max: 12, default: null, hint: 'centre to centre in a row' },
    { name: 'tube', label: 'Outside diameter of a tube riveted through', unit: 'in', kind: 'length', min: 0.1, max: 4, default: null },
    { name: 'part', label: 'Part number', unit: '', kind: 'part', default: null, hint: 'such as AN470AD4-7' },
  ],
  results: [
    { name: 'hole', label: 'Final hole', unit: 'in' }, { name: 'pilot', label: 'Pilot', unit: 'in' },
    { name: 'length', label: 'Length needed', unit: 'in' }, { name: 'rivet', label: 'Rivet, nearest length', unit: 'in' }, { name: 'rivet-next', label: 'Rivet, next longer', unit: 'in' },
    { name: 'head-width', label: 'Shop head, width', unit: 'in' }, { name: 'head-height', label: 'Shop head, height', unit: 'in' },
    { name: 'head-width-least', label: 'Shop head, width at least', unit: 'in' }, { name: 'head-height-least', label: 'Shop head, height at least', unit: 'in' },
    { name: 'edge-centre', label: 'Edge, from the centre of the hole', unit: 'in' }, { name: 'edge-rim', label: 'Edge, from the rim of the hole', unit: 'in' },
    { name: 'pitch-least', label: 'Pitch, at least', unit: 'in' }, { name: 'pitch-usual', label: 'Pitch, usual', unit: 'in' },
    { name: 'row-least', label: 'Row spacing, at least', unit: 'in' }, { name: 'row-usual', label: 'Row spacing, usual', unit: 'in' },
    { name: 'sheet-diameter', label: 'Diameter for the sheet', unit: 'in' }, { name: 'sheet-stock', label: 'Stock diameter to start from', unit: 'in' },
    { name: 'tube-diameter', label: 'Diameter through a tube, at least', unit: 'in' },
    { name: 'alloy', label: 'Alloy and head mark', unit: '' }, { name: 'replacement', label: '2117 in its place', unit: 'in' }, { name: 'part', label: 'Part number reads', unit: '' },
  ],
  cautions: ['structure', 'eyes', 'hearing', 'sharp-edges'],
  check: (given) => {
    const part = given.optionalWord('part')
    return part === undefined || decodeRivet(part) ? [] : [{ path: 'part', message: 'Part number: write a solid rivet such as AN470AD4-7, AN426AD3-4 or MS20470AD4-3.5.' }]
  },
  work: (given) => [...rivetBody(given), ...edgeAndPitch(given), ...alloyWords(given), ...partWords(given)],
})
