import { checkPour } from '@wedgeline/engine'
import { cleanup, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, test, vi } from 'vitest'
import { methodId } from '@/features/methods/method'
import { narrowed } from '@/features/methods/method-filter'
import { METHODS } from '@/features/methods/method-table'
import { MethodsScreen } from '@/features/methods/methods-screen'
import { expectAccessible } from '../components/axe'
import { row } from '../engine/anchor-checks'
import { renderOver } from './fake-server'

const state = vi.hoisted((): { asked: Record<string, string | undefined>; setParams: ReturnType<typeof vi.fn> } => ({
  asked: {},
  setParams: vi.fn(),
}))
vi.mock('expo-router', () => ({
  router: { push: () => {}, setParams: state.setParams },
  useLocalSearchParams: () => state.asked,
}))

// jsdom lays nothing out and has no scrolling.
const scrolled = vi.fn()
Element.prototype.scrollIntoView = scrolled

beforeEach(() => {
  state.asked = {}
  state.setParams.mockClear()
})

const entries = async () => {
  await screen.findByRole('heading', { name: 'Bearing' })
  return screen.getAllByRole('listitem').filter((item) => item.id.startsWith('method-'))
}

test('every formula stands there once, with its clause, how sure it is and its check value', async () => {
  renderOver({}, <MethodsScreen />)
  expect(await entries()).toHaveLength(METHODS.length)
  const bursting = document.getElementById(`method-${methodId({ symbol: 'T', formula: '0.25 * F * (b - a) / b' })}`)
  expect(bursting?.textContent).toContain('EN 1992-1-1:2004, 6.5.3(3) Eq. 6.58')
  expect(bursting?.textContent).toContain('read in a digest')
  expect(bursting?.textContent).toContain('EX17')
  expect(bursting?.textContent).toContain('published/en-1992-anchors.test.ts')
  expect(screen.getByText(/^\d+ formulas on \d+ clauses: /).textContent).toContain('from memory')
})

test('the address narrows the list, and choosing writes the address', async () => {
  state.asked = { basis: 'as-3600', family: 'bearing', sure: 'memory' }
  renderOver({}, <MethodsScreen />)
  const shown = await entries()
  expect(shown.length).toBeGreaterThan(3)
  for (const item of shown) {
    expect(item.textContent).toContain('from memory')
    expect(item.textContent).not.toContain('EN 1992-1-1:2004,')
  }
  await userEvent.selectOptions(screen.getByRole('combobox', { name: 'Basis' }), 'en-1992')
  expect(state.setParams).toHaveBeenCalledWith({ basis: 'en-1992', method: undefined })
})

test('an address that asks for nothing that there is shows how to widen the list', async () => {
  state.asked = { family: 'cover', sure: 'computed' }
  renderOver({}, <MethodsScreen />)
  await userEvent.click(await screen.findByRole('button', { name: 'Show all' }))
  expect(state.setParams).toHaveBeenCalledWith({ basis: 'all', family: 'all', sure: 'all', method: undefined })
})

test('the formula that a calculation asks for is the one that is marked, in words as well', async () => {
  state.asked = { method: methodId({ symbol: 'fcd', formula: 'alphaCc * fck / gammaC' }) }
  renderOver({}, <MethodsScreen />)
  const marked = (await entries()).filter((item) => item.getAttribute('aria-current') === 'true')
  expect(marked).toHaveLength(1)
  expect(scrolled.mock.contexts).toEqual([marked[0]])
  expect(within(marked[0] ?? document.body).getByText(/asked for/).textContent).toContain('Design strength')
})

test('axe finds nothing', async () => {
  state.asked = { basis: 'as-3600', family: 'bearing' }
  renderOver({}, <MethodsScreen />)
  await entries()
  await expectAccessible(document.body)
  cleanup()
})

describe('every line of a calculation has its place in the list', () => {
  test.each(['en-1992', 'as-3600'])('%s', (basis) => {
    const of = row('K4')
    const steps = checkPour({ ...of, job: { ...of.job, basis } }, { pourId: 'P1', withSteps: true }).zones.flatMap(
      (zone) => zone.checks.flatMap((check) => (check.kind === 'compared' ? check.steps : [])),
    )
    const ids = new Set(METHODS.map(({ id }) => id))
    expect(steps.length).toBeGreaterThan(100)
    expect(
      steps.filter((step) => !ids.has(methodId(step))).map(({ symbol, formula }) => `${symbol} = ${formula}`),
    ).toEqual([])
  })

  test('sets and mats of one kind are one formula', () => {
    const id = (symbol: string, formula: string) => methodId({ symbol, formula })
    expect(id('AsCounted', 'As1 + As2 + As3')).toBe(id('AsCounted', 'As1'))
    expect(id('AsCounted', '0')).toBe(id('AsCounted', 'As1'))
    expect(id('As2', 'n * legs * A * share')).toBe(id('As1', 'n * legs * A * share'))
    // Another formula with the same look is not: the width of a joint's strip has two sides, not any number.
    expect(id('w', 'd1 + d2')).not.toBe(id('w', 'd1 + d2 + d3'))
  })
})

test('the schedule belongs to every basis', () => {
  const shown = narrowed(METHODS, { basis: 'as-3600', family: 'schedule', sureness: null })
  expect(shown.length).toBeGreaterThan(15)
})
