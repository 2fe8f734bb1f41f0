import { afterEach, expect, test, vi } from 'vitest'
import { chromiumPath, launchOptions } from '../../scripts/chromium.mjs'

afterEach(() => vi.unstubAllEnvs())

test('a browser that CHROMIUM_PATH names is taken', () => {
  vi.stubEnv('CHROMIUM_PATH', process.execPath)
  expect(chromiumPath()).toBe(process.execPath)
  expect(launchOptions().executablePath).toBe(process.execPath)
})

test('a CHROMIUM_PATH without a file is said, and not replaced by another browser', () => {
  vi.stubEnv('CHROMIUM_PATH', '/nowhere/chromium')
  expect(() => chromiumPath()).toThrow('CHROMIUM_PATH names /nowhere/chromium, where there is no file.')
})
