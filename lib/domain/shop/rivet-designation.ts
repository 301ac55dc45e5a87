// Part numbers of solid rivets: AN470AD4-7 is a universal head, 2117-T4, 1/8 in, 7/16 in long. Sizes and holes are rivet-table.ts.
import data from '@/content/shop/rivets.json'
import { fractionOfInch } from './exact-fraction'

export interface RivetDesignation {
  /** The part as given, tidied: "MS20470AD4-3.5". */
  part: string
  head: 'universal' | '100-degree countersunk'
  /** "AD", with its alloy where the table knows it. */
  alloyCode: string
  alloy: string | null
  headMark: string | null
  diameter: number
  length: number
  /** The MS number of the same rivet. */
  msNumber: string
}

const form = /^(?:AN|MS20|NASM20)(470|426)([A-Z]{1,2})(\d{1,2})-(\d{1,2}(?:\.5)?)$/

/** Reads AN470, AN426 and MS20470, MS20426 numbers; null for anything else. Diameter in 1/32 in, length in 1/16 in, .5 is a half size. */
export function decodeRivet(text: string): RivetDesignation | null {
  const match = form.exec(text.trim().toUpperCase().replace(/\s+/g, ''))
  const [part = '', headCode = '', alloyCode = '', diameterCode = '', lengthCode = ''] = match ?? []
  const head = data.heads.find((row) => row.part === headCode)
  const diameter = Number(diameterCode) / 32
  const length = Number(lengthCode) / 16
  if (!match || !head || diameter === 0 || length === 0) return null
  const known = data.alloys.find((row) => row.code === alloyCode)
  return {
    part, head: headCode === '470' ? 'universal' : '100-degree countersunk', alloyCode, alloy: known?.alloy ?? null, headMark: known?.mark ?? null,
    diameter, length, msNumber: `${head.ms}${alloyCode}${diameterCode}-${lengthCode}`,
  }
}

/** "AN470AD4-4" for a head, an alloy code, a diameter and a length in whole or half sixteenths. */
export function rivetDesignation(head: 'universal' | 'flush', alloyCode: string, diameter: number, length: number): string {
  return `AN${head === 'flush' ? '426' : '470'}${alloyCode}${Math.round(diameter * 32)}-${Math.round(length * 32) / 2}`
}

/** "1/8 in, 7/16 in long": the sizes of a designation in words. */
export function rivetSizeWords({ diameter, length }: RivetDesignation): string {
  return `${fractionOfInch(diameter)} in, ${fractionOfInch(length)} in long`
}
