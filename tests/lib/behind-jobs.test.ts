// @vitest-environment jsdom
import { beforeEach, describe, expect, test, vi } from 'vitest'

const page = (address: string | null) => {
  document.head.innerHTML = address === null ? '' : `<meta name="wedgeline-shared-script" content="${address}">`
}
const script = () => document.querySelector<HTMLScriptElement>('script')
const fresh = async () => (await import('@/lib/behind-jobs.web')).behindJobs

beforeEach(() => {
  vi.resetModules()
  page(null)
})

describe('a part behind the jobs', () => {
  test('loads at once where the page names no shared script', async () => {
    const behindJobs = await fresh()
    expect(await behindJobs(() => Promise.resolve('edge'))).toBe('edge')
    expect(script()).toBeNull()
  })

  test('waits for the shared script, which is asked for once', async () => {
    page('/shared.js')
    const behindJobs = await fresh()
    const load = vi.fn(() => Promise.resolve('edge'))
    const both = Promise.all([behindJobs(load), behindJobs(load)])
    await Promise.resolve()
    expect(load).not.toHaveBeenCalled()
    expect(document.querySelectorAll('script')).toHaveLength(1)
    expect(script()?.getAttribute('src')).toBe('/shared.js')
    script()?.dispatchEvent(new Event('load'))
    expect(await both).toEqual(['edge', 'edge'])
  })

  test('says so where it cannot be fetched, and asks again the next time', async () => {
    page('/shared.js')
    const behindJobs = await fresh()
    const load = () => Promise.resolve('edge')
    const first = behindJobs(load)
    await Promise.resolve()
    script()?.dispatchEvent(new Event('error'))
    await expect(first).rejects.toThrow('/shared.js')
    const second = behindJobs(load)
    await Promise.resolve()
    script()?.dispatchEvent(new Event('load'))
    expect(await second).toBe('edge')
  })
})
