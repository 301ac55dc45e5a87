// Which way a result protects: from too little, from too much, or both. Results that are a size to make, and no limit, protect neither way.
export type LimitSense = 'least' | 'most' | 'both'

const LEAST: Readonly<Record<string, readonly string[]>> = {
  'rivet': ['edge-centre', 'edge-rim', 'pitch-least', 'row-least', 'head-width-least', 'head-height-least', 'tube-diameter'],
  'countersink-or-dimple': ['sheet-spare'],
  'bolt': ['threads-showing-least'],
  'torque': ['prevailing'],
  'grommet': ['clearance', 'through-clear'],
  'bend': ['radius-least', 'radius-times'],
  'tube': ['bend-radius', 'flattened', 'hose-bend-radius'],
  'wire': ['clearance', 'fluid', 'fluid-reduced', 'reterminations'],
}
const MOST: Readonly<Record<string, readonly string[]>> = {
  'bolt': ['threads-in-hole-most'], 'torque': ['most', 'castle-limit', 'heat'], 'tube': ['hose-support'], 'wire': ['support', 'slack', 'ties', 'allowed'],
}
const BOTH: Readonly<Record<string, readonly string[]>> = { torque: ['torque', 'castle-start', 'with-drag'], tube: ['torque'], bolt: ['hole'] }

/** Null for a result that is no limit. */
export function limitSense(table: string, result: string): LimitSense | null {
  const has = (list: Readonly<Record<string, readonly string[]>>) => Object.hasOwn(list, table) && (list[table] ?? []).includes(result)
  return has(LEAST) ? 'least' : has(MOST) ? 'most' : has(BOTH) ? 'both' : null
}

/** What a value allows, ends included: a plain number of a least result is its lower end, of a most result its upper one. Null for words. */
export function allowedBy({ number, min, max }: { number?: number; min?: number; max?: number }, sense: LimitSense | null): { low: number; high: number } | null {
  if (number === undefined && min === undefined && max === undefined) return null
  const low = min ?? (sense === 'most' ? undefined : number) ?? -Infinity
  const high = max ?? (sense === 'least' ? undefined : number) ?? Infinity
  // A least result may be given as a span ("2 to 4 t"): its upper end forbids nothing.
  return { low, high: sense === 'least' ? Infinity : high }
}
