// AN931 / MS35489 grommets by their designation rule. The standard sheet was not seen: the grommet in hand is measured first.
import data from '@/content/shop/grommets.json'
import { fractionOfInch, inchesOf } from './exact-fraction'

export interface Grommet {
  designation: string
  /** Inside diameter, the side of the wire. Inches. */
  bore: number
  /** Hole in the sheet: the groove sits in it. Inches. */
  hole: number
  cite: string
  also?: string
}

/** Common grommets, smallest bore first. */
export const GROMMETS: readonly Grommet[] = data.rows.map(({ designation, bore16, hole16, cite, also }) => ({
  designation, bore: bore16 / data.rule.sixteenths, hole: hole16 / data.rule.sixteenths, cite, ...(also ? { also } : {}),
}))

/** AN931-A-B by the rule: bore A/16 in, hole B/16 in. Null for anything else, and where the hole would not be larger than the bore. */
export function decodeGrommet(text: string): Grommet | null {
  const match = /^AN931-(\d{1,2})-(\d{1,2})$/.exec(text.trim().toUpperCase().replace(/\s+/g, ''))
  const [bore, hole] = [Number(match?.[1]), Number(match?.[2])]
  if (!match || bore === 0 || hole <= bore) return null
  return GROMMETS.find(({ designation }) => designation === `AN931-${bore}-${hole}`) ?? { designation: `AN931-${bore}-${hole}`, bore: bore / 16, hole: hole / 16, cite: data.rule.cite }
}

export const grommetsOfBore = (bore: number): Grommet[] => GROMMETS.filter((grommet) => Math.abs(grommet.bore - bore) < 1e-6)
export const grommetsOfHole = (hole: number): Grommet[] => GROMMETS.filter((grommet) => Math.abs(grommet.hole - hole) < 1e-6)

/** The smallest listed grommet that a tube, conduit or bundle of this diameter goes through, or null. */
export const grommetFor = (outside: number): Grommet | null => GROMMETS.find(({ bore }) => bore >= outside - 1e-9) ?? null

/** The steps of a step drill that bracket a hole: exact, or the one under and the one over. */
export function stepDrill(hole: number): { exact: string | null; under: string | null; over: string | null } {
  const [from, to, step] = [inchesOf(data.stepDrill.from), inchesOf(data.stepDrill.to), inchesOf(data.stepDrill.step)]
  const at = (inches: number): string | null => (inches >= from - 1e-9 && inches <= to + 1e-9 ? fractionOfInch(inches) : null)
  const steps = hole / step
  const whole = Math.abs(steps - Math.round(steps)) < 1e-6
  return { exact: whole ? at(Math.round(steps) * step) : null, under: at((whole ? Math.round(steps) - 1 : Math.floor(steps)) * step), over: at((whole ? Math.round(steps) + 1 : Math.ceil(steps)) * step) }
}
