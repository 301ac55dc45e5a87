// Whether a kit maker's limit speaks to a claim, and what it then allows. A limit for one size says nothing about another.
import { holdsFor, inchesOfInput } from '../shop/limit-inputs'
import { DIAMETERS } from '../shop/limit-quantity'
import { allowedBy, limitSense } from '../shop/limit-sense'
import type { MakerLimit } from '../shop/maker-limits'
import { readInputs, type ShopInput } from '../shop/shop-input'
import { shopTable } from '../shop/shop-tables'
import { threadDiameter } from '../shop/torque-rules'
import type { Allowed, Claim } from './judge'

/** 'may-hold': it names an input that the text leaves open, so that it excuses a number but doesn't confirm one. */
export type Standing = 'holds' | 'may-hold' | 'no'

/** A bolt of the AN series is named by its nominal size, its thread by the screw's own: AN3 is 3/16 and 0.190. */
const sameSize = 0.004

/** The input of each table that says how large the thing is. */
const sizeInputs: Readonly<Record<string, string>> = { 'rivet': 'diameter', 'countersink-or-dimple': 'diameter', 'torque': 'thread', 'bolt': 'bolt', 'grommet': 'bore', 'bend': 'thickness', 'tube': 'size' }

export function makerStanding(limit: MakerLimit, claim: Claim): Standing {
  if (limit.table !== claim.table || limit.result !== claim.result) return 'no'
  // Without a rivet's size its distances are said in diameters, and no limit in inches can be held against them.
  if (claim.table === 'rivet' && claim.size === undefined && limit.unit !== DIAMETERS) return 'no'
  const table = shopTable(limit.table)
  const named = Object.entries(limit.inputs).map(([name, text]): Standing => {
    const input = table?.inputs.find((each) => each.name === name)
    return input ? inputStanding(input, text, claim) : 'no'
  })
  return named.includes('no') ? 'no' : named.includes('may-hold') ? 'may-hold' : 'holds'
}

/** What the limit allows, in the claim's units; null for a limit in words. */
export function makerAllowed({ value, unit, display, table, result, reference }: MakerLimit, { size = 1 }: Claim): Allowed | null {
  const allowed = allowedBy(value, limitSense(table, result))
  const scale = unit === DIAMETERS ? size : 1
  return allowed && { low: allowed.low * scale, high: allowed.high * scale, expected: `${display.inch}, the kit maker's limit`, citation: { source: reference, basis: 'maker', notes: [] } }
}

function inputStanding(input: ShopInput, text: string, { table, size, said = {} }: Claim): Standing {
  if (sizeInputs[table] === input.name) {
    const wanted = sizeOf(table, input, text)
    return size === undefined || wanted === null ? 'may-hold' : Math.abs(wanted - size) < sameSize ? 'holds' : 'no'
  }
  const present = said[input.name]
  return present === undefined ? 'may-hold' : holdsFor({ inputs: [input] }, { [input.name]: text }, { [input.name]: present }) ? 'holds' : 'no'
}

function sizeOf(table: string, input: ShopInput, text: string): number | null {
  const read = readInputs([input], { [input.name]: text })
  const value = read.ok ? read.inputs[input.name] : undefined
  if (typeof value !== 'string') return inchesOfInput(input, text)
  if (table === 'torque') return threadDiameter(value)
  const sixteenths = /^(?:AN|-)(\d+)$/.exec(value)?.[1]
  return sixteenths ? Number(sixteenths) / 16 : inchesOfInput(input, value)
}
