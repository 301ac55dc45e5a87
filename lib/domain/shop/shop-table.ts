// What a shop table is: typed inputs with limits, results with unit, source and basis, and one pure computation.
// The tables themselves are beside this file, the facts they compute from are data in content/shop.
import type { CautionTopic } from '@/lib/domain/cautions/rule-table'
import { InputReader, readInputs, type InputError, type RawInputs, type ShopInput, type ShopInputs } from './shop-input'

/** Where a value stands: edition and place. */
export interface Source {
  title: string
  section: string
  year: string
}

/** seen: found in the source; arithmetic: worked out from a rule that was found; memory: recalled, not checked; maker: the kit maker's own. */
export const BASES = ['seen', 'arithmetic', 'memory', 'common-practice', 'maker'] as const
export type Basis = (typeof BASES)[number]

/** One value, a range, or words. Nothing at all where the table gives no value: then the note says so. */
export interface ShopValue {
  number?: number
  min?: number
  max?: number
  label?: string
}

/** One result from one source. Sources that differ give several results of one name, never a blend. */
export interface ShopResult {
  name: string
  value: ShopValue
  unit: string
  display: { inch: string; metric: string }
  source: Source | null
  basis: Basis
  /** What must be said beside the number. */
  note?: string
  /** The arithmetic in words: "0.065 + 1.5 D". */
  how?: string
  /** In what the reader's own measure doesn't meet this: "short by 1/32 of 2 D". It stands in the note too. */
  against?: string
}

export interface ResultDeclaration {
  name: string
  label: string
  unit: string
}

export type ShopOutcome =
  | { ok: true; inputs: ShopInputs; results: ShopResult[] }
  | { ok: false; errors: InputError[] }

export interface ShopTable {
  slug: string
  title: string
  inputs: readonly ShopInput[]
  results: readonly ResultDeclaration[]
  /** Caution topics of what the table is about. */
  cautions: readonly CautionTopic[]
  /** Reads, checks and computes. Never throws: what is out of limits comes back as errors that name the field. */
  compute(raw: RawInputs): ShopOutcome
}

export interface TableDefinition extends Omit<ShopTable, 'compute'> {
  /** Inputs together that make no sense though each is within its limits. */
  check?: (given: InputReader) => InputError[]
  work: (given: InputReader) => ShopResult[]
}

/** Makes a table of its declaration: inputs are read against their limits before `work` sees them. */
export function defineTable({ check, work, ...table }: TableDefinition): ShopTable {
  return {
    ...table,
    compute(raw) {
      const read = readInputs(table.inputs, raw)
      if (!read.ok) return read
      const given = new InputReader(read.inputs)
      const errors = check?.(given) ?? []
      return errors.length > 0 ? { ok: false, errors } : { ok: true, inputs: read.inputs, results: work(given) }
    },
  }
}
