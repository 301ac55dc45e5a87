// RFC 9457 problem details: the only shape in which /api refuses. Never a stack trace, never HTML.
import 'server-only'
import { AppError, errorTitle, type ErrorCode } from '@/lib/errors'
import { DatabaseBusyError } from '@/db/transaction'
import { SearchLoadingError } from '@/lib/search/messages'
import type { z } from 'zod'

/** A problem response for any AppError; Retry-After where waiting helps. */
export function problem(error: AppError): Response {
  const body = {
    type: `about:blank#${error.code}`, title: errorTitle[error.code], status: error.status, detail: error.message,
    ...(error.errors.length ? { errors: error.errors } : {}), ...(error.current !== undefined ? { current: error.current } : {}), ...(error.cautions !== undefined ? { cautions: error.cautions } : {}),
  }
  const wait = error.retryAfterSeconds ?? (error.status === 503 ? 1 : undefined)
  return Response.json(body, {
    status: error.status,
    headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store', ...(wait !== undefined ? { 'retry-after': String(Math.ceil(wait)) } : {}) },
  })
}

/** Expected errors become an AppError; anything else is null and is thrown on, to be logged once. */
export function asAppError(error: unknown): AppError | null {
  if (error instanceof AppError) return error
  if (error instanceof SearchLoadingError) return new AppError('loading', 'Search is loading. Everything else works; try again in a moment.', { retryAfterSeconds: 1 })
  if (error instanceof DatabaseBusyError) return new AppError('busy', 'The database is busy. Nothing was written; try again.', { retryAfterSeconds: 2 })
  return null
}

/** Zod's issues as one refusal. Unknown fields are named. */
export function invalid(error: z.ZodError, code: ErrorCode = 'invalid'): AppError {
  const errors = error.issues.map((issue) => ({
    path: [...issue.path, ...(issue.code === 'unrecognized_keys' ? issue.keys.slice(0, 1) : [])].join('.'),
    message: issue.code === 'unrecognized_keys' ? `Unknown field ${issue.keys.join(', ').slice(0, 200)}.` : issue.message,
  }))
  return new AppError(code, errors[0]?.message ?? errorTitle[code], { errors: errors.slice(0, 50) })
}

