// What travels between a form and its action. Safe for the browser.
import type { Caution } from './schemas/post'
import type { ErrorCode, FieldError } from './errors'

/** What a form gets back when it was refused. `values` is what was typed, so that nothing is lost without JavaScript either. */
export interface FormState {
  message: string
  code?: ErrorCode
  errors: FieldError[]
  values: Record<string, string | string[]>
  /** The present version, on a conflict. */
  current?: unknown
  /** Cautions still to be acknowledged. */
  cautions?: readonly Caution[]
  /** Says what was done, where the page stays. */
  done?: string
}

export const emptyForm: FormState = { message: '', errors: [], values: {} }
