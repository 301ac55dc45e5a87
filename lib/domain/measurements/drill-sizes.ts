// Twist drills by number, letter and 64ths of an inch. Source: ANSI/ASME B94.11M Twist Drills, number and letter series, year 1993
// (sizes unchanged since the 1979 edition). Which drill a rivet takes is not here.
import type { Ratio } from './units'

/** Decimal inches of #1, #2 … #80, in that order. */
const numbers = ('0.228 0.221 0.213 0.209 0.2055 0.204 0.201 0.199 0.196 0.1935 0.191 0.189 0.185 0.182 0.18 0.177 0.173 0.1695 0.166 0.161 '
  + '0.159 0.157 0.154 0.152 0.1495 0.147 0.144 0.1405 0.136 0.1285 0.12 0.116 0.113 0.111 0.11 0.1065 0.104 0.1015 0.0995 0.098 '
  + '0.096 0.0935 0.089 0.086 0.082 0.081 0.0785 0.076 0.073 0.07 0.067 0.0635 0.0595 0.055 0.052 0.0465 0.043 0.042 0.041 0.04 '
  + '0.039 0.038 0.037 0.036 0.035 0.033 0.032 0.031 0.0292 0.028 0.026 0.025 0.024 0.0225 0.021 0.02 0.018 0.016 0.0145 0.0135').split(' ')

/** Decimal inches of A, B … Z, in that order. */
const letters = ('0.234 0.238 0.242 0.246 0.25 0.257 0.261 0.266 0.272 0.277 0.281 0.29 0.295 0.302 0.316 0.323 0.332 0.339 0.348 0.358 '
  + '0.368 0.377 0.386 0.397 0.404 0.413').split(' ')

/** `name` as a shop says it: #30, F, 3/16. n / d is the diameter in inches, exactly. */
export interface DrillSize extends Ratio { name: string; series: 'number' | 'letter' | 'fraction'; inches: number }

const listed = (name: string, series: DrillSize['series'], text: string): DrillSize => ({ name, series, inches: Number(text), n: Math.round(Number(text) * 10_000), d: 10_000 })

const numberSizes = numbers.map((text, index) => listed(`#${index + 1}`, 'number', text))
const letterSizes = letters.map((text, index) => listed(String.fromCharCode(65 + index), 'letter', text))
const fractionSizes = Array.from({ length: 64 }, (_, index): DrillSize => ({ name: sixtyFourths(index + 1), series: 'fraction', inches: (index + 1) / 64, n: index + 1, d: 64 }))

/** All sizes, the smallest first. */
export const drillSizes: readonly DrillSize[] = [...numberSizes, ...letterSizes, ...fractionSizes].sort((a, b) => a.inches - b.inches)

const byName = new Map(drillSizes.map((drill) => [drill.name, drill]))

/** A number drill, 1 to 80; undefined beyond. */
export const numberDrill = (number: number): DrillSize | undefined => numberSizes[number - 1]

/** A drill by its name as in `DrillSize`, letters in capitals. */
export const drillNamed = (name: string): DrillSize | undefined => byName.get(name)

function sixtyFourths(count: number): string {
  let [n, d] = [count, 64]
  while (n % 2 === 0 && d > 1) [n, d] = [n / 2, d / 2]
  return d === 1 ? String(n) : `${n}/${d}`
}
