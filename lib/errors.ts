// The one vocabulary of expected refusals: a code, its status, and words for the person it happened to.

export const errorStatus = {
  malformed: 400, unauthenticated: 401, forbidden: 403, 'not-found': 404, 'method-not-allowed': 405, conflict: 409, 'too-large': 413,
  'unsupported-media-type': 415, invalid: 422, 'too-many': 429, loading: 503, busy: 503,
} as const
export type ErrorCode = keyof typeof errorStatus

export const errorTitle: Record<ErrorCode, string> = {
  malformed: 'Could not be read', unauthenticated: 'Sign in first', forbidden: 'Not allowed', 'not-found': 'Not there',
  'method-not-allowed': 'Not that way', conflict: 'Changed meanwhile', 'too-large': 'Too large', 'unsupported-media-type': 'Send JSON',
  invalid: 'Something needs mending', 'too-many': 'Too many at once', loading: 'Search is loading', busy: 'Busy, try again',
}

export interface FieldError { path: string; message: string }
interface Details { errors?: FieldError[]; current?: unknown; cautions?: unknown; retryAfterSeconds?: number }

/** A refusal that was expected. Its message is shown to people and names the next step. */
export class AppError extends Error {
  readonly code: ErrorCode
  readonly errors: FieldError[]
  readonly current: unknown
  /** Cautions that have to be acknowledged, with their words. */
  readonly cautions: unknown
  readonly retryAfterSeconds: number | undefined

  constructor(code: ErrorCode, message: string, details: Details = {}) {
    super(message)
    this.name = 'AppError'
    this.code = code
    this.errors = details.errors ?? []
    this.current = details.current
    this.cautions = details.cautions
    this.retryAfterSeconds = details.retryAfterSeconds
  }

  get status(): number {
    return errorStatus[this.code]
  }
}

/** Refusals every service says the same way. */
export const refuse = {
  notFound: (what = 'That') => new AppError('not-found', `${what} is not there, or not to be seen.`),
  forbidden: (why: string) => new AppError('forbidden', why),
  signIn: () => new AppError('unauthenticated', 'Sign in to do this.'),
  invalid: (path: string, message: string) => new AppError('invalid', message, { errors: [{ path, message }] }),
}
