// What a kind of statement is given and gives back.
import type { MakerLimit } from '../../shop/maker-limits'
import type { Finding } from '../judge'
import type { Statement } from '../statement'
import type { Carried, Subject } from '../subjects'

export interface Scene {
  statement: Statement
  /** In the statement itself. */
  subjects: readonly Subject[]
  /** From the sentences before and the hardware: only where the statement names none of its own. */
  carried: Carried
  limits: readonly MakerLimit[]
}

export type Kind = (scene: Scene) => Finding[]

/** The rivets a statement is about; the one carried over when it names none. */
export function rivetsOf({ subjects, carried }: Scene): Subject[] {
  const own = subjects.filter(({ kind }) => kind === 'rivet')
  return own.length > 0 ? own : subjects.length === 0 && carried.rivet ? [carried.rivet] : []
}
