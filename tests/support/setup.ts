// An unexpected console.error fails the test that caused it: errors are part of what a test checks.
import { afterEach, beforeEach, expect, vi } from 'vitest'

beforeEach(() => {
  vi.spyOn(console, 'error')
})
afterEach(() => {
  expect(console.error).not.toHaveBeenCalled()
  vi.restoreAllMocks()
})
