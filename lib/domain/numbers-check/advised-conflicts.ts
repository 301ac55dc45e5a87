// Which checks stop a stamp until its mentor says why the text is right all the same.
import type { NumbersCheck } from './numbers-check'

/** What the author advises and no listed source allows. Measured numbers are charged to nobody. */
export const advisedConflicts = (checks: readonly NumbersCheck[]): NumbersCheck[] => checks.filter((c) => c.role === 'advised' && c.verdict === 'conflicts')
