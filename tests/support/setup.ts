// An unexpected console.error fails the test that caused it: errors are part of what a test checks.
import { AsyncLocalStorage } from 'node:async_hooks'
import { afterEach, beforeEach, expect, vi } from 'vitest'

// The framework's request storages pick it up from here when they are first loaded; its server does the same.
Object.assign(globalThis, { AsyncLocalStorage })

beforeEach(() => {
  vi.spyOn(console, 'error')
})
afterEach(() => {
  expect(console.error).not.toHaveBeenCalled()
  vi.restoreAllMocks()
})
