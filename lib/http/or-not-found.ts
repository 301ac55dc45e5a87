// Pages ask services; what a service cannot find or may not show becomes the framework's 404 or 403.
import 'server-only'
import type { Route } from 'next'
import { forbidden, notFound, redirect, unauthorized } from 'next/navigation'
import { AppError } from '@/lib/errors'

/** Reads the id in an address and runs `get`; not-found for anything that is no id. `moved` says where something else stands now, if it does. */
export async function orNotFound<T>(id: string, get: (id: number) => Promise<T>, moved?: (id: number) => Promise<Route | null>): Promise<T> {
  if (!/^[1-9][0-9]{0,14}$/.test(id)) notFound()
  try {
    return await get(Number(id))
  } catch (error) {
    if (error instanceof AppError && error.code === 'not-found') {
      const address = await moved?.(Number(id))
      if (address) redirect(address)
      notFound()
    }
    if (error instanceof AppError && error.code === 'unauthenticated') unauthorized()
    if (error instanceof AppError && error.code === 'forbidden') forbidden()
    throw error
  }
}
