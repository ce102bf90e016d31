import { afterEach, beforeEach, expect, vi } from 'vitest'

/** An unexpected console.error fails the test that caused it. */
beforeEach(() => {
  vi.spyOn(console, 'error')
})
afterEach(() => {
  const calls = vi.mocked(console.error).mock.calls
  vi.restoreAllMocks()
  expect(calls, 'console.error was called').toEqual([])
})
