import { layoutSchema, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour } from '@wedgeline/engine'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, expect, test, vi, type Mock } from 'vitest'
import { CalculationScreen } from '@/features/calculation/calculation-screen'
import { NewPourScreen } from '@/features/pour/new-pour-screen'
import { PourZonesScreen } from '@/features/pour/zones-screen'
import { expectAccessible } from '../components/axe'
import example from '../../docs/example-layout.json'

interface Shown {
  edit: Mock
  replace: Mock
  canEdit: boolean
  layout: unknown
  checks: unknown
  status: string | undefined
}

const state = vi.hoisted((): Shown => ({
  edit: vi.fn(),
  replace: vi.fn(),
  canEdit: true,
  layout: null,
  checks: null,
  status: undefined,
}))

vi.mock('expo-router', () => ({
  router: { push: () => {}, replace: state.replace },
  useLocalSearchParams: () => ({ status: state.status }),
}))
vi.mock('@/features/editing/job-draft', () => ({
  useJobDraft: () => ({
    jobId: 'job',
    layout: state.layout,
    roles: ['detailer'],
    canEdit: state.canEdit,
    save: 'saved',
    problem: null,
    edit: state.edit,
  }),
}))
vi.mock('@/features/editing/pour-checks', () => ({ usePourChecks: () => state.checks }))
vi.mock('@/features/editing/save-state', () => ({ SaveState: () => null }))

const layout: LayoutFile = layoutSchema.parse(example)
const pourId = layout.pours[0]?.id ?? ''
const result = checkPour(toEngine(layout), { pourId, withSteps: true })

beforeEach(() => {
  state.layout = layout
  state.checks = { result, failure: null, isStale: false }
  state.status = undefined
  state.canEdit = true
  state.edit.mockClear()
  state.replace.mockClear()
})

test('zones wait, fail and say that a pour is gone, each in words', () => {
  state.checks = { result: null, failure: null, isStale: true }
  const { rerender } = render(<PourZonesScreen jobId="job" pourId={pourId} />)
  expect(screen.getByRole('status').textContent).toContain('the checks of this pour')
  state.checks = { result: null, failure: 'No anchor has the id.', isStale: false }
  rerender(<PourZonesScreen jobId="job" pourId={pourId} />)
  expect(screen.getByRole('alert').textContent).toContain('could not be made')
  rerender(<PourZonesScreen jobId="job" pourId="gone" />)
  expect(screen.getByRole('alert').textContent).toContain('not in the job')
})

test('zones narrowed to a status show no other, and the count is that of the pour', async () => {
  state.status = 'over'
  render(<PourZonesScreen jobId="job" pourId={pourId} />)
  const filters = screen.getByRole('navigation', { name: 'Checks by status' })
  expect(within(filters).getByRole('link', { current: true }).textContent).toContain(`${result.counts.over} over`)
  const overZones = result.zones.filter(({ checks }) =>
    checks.some((c) => c.kind === 'compared' && c.status === 'over'),
  )
  expect(screen.getAllByRole('link', { name: /^Calculation of/ })).toHaveLength(overZones.length)
  await expectAccessible()
})

test('a calculation shows every step with its numbers, and names nothing as not yet checked', async () => {
  const zone = result.zones.find(({ checks }) => checks.some(({ name }) => name === 'Bursting in plan'))
  render(<CalculationScreen jobId="job" zoneId={encodeURIComponent(zone?.zone.id ?? '')} />)
  const sheet = screen.getByRole('main').textContent.replaceAll('\u202f', '')
  // P = share Pjack and F = 1.2 P, 588.8 kN for four strands at 0.8 of 184 kN: 0.8 x 4 x 184,000 = 588,800 N.
  expect(sheet).toContain('4 × (0.8 × 184000) = 588800 N')
  expect(sheet).toContain('1.2 × 588800 = 706560 N')
  expect(sheet).not.toContain('Not yet checked')
  expect(sheet).toContain('do not replace one')
  expect(sheet).not.toMatch(/en-window|needs-judgement|gammaP/)
  await expectAccessible()
})

test('a calculation of a zone that is gone says what to do', () => {
  render(<CalculationScreen jobId="job" zoneId="anchor:gone" />)
  expect(screen.getByRole('alert').textContent).toContain('pick another zone')
})

test('a rectangular pour takes its two sizes and one press', async () => {
  render(<NewPourScreen jobId="job" />)
  await userEvent.type(screen.getByRole('textbox', { name: 'Size east, mm' }), '18000{Tab}')
  await userEvent.type(screen.getByRole('textbox', { name: 'Size north, mm' }), '9000{Tab}')
  await userEvent.click(screen.getByRole('button', { name: /^Make pour/ }))
  expect(state.edit).toHaveBeenCalledTimes(1)
  expect(state.replace).toHaveBeenCalledTimes(1)
  await expectAccessible()
})

test('a pour without sizes is not made, and the outline says what it needs', async () => {
  render(<NewPourScreen jobId="job" />)
  await userEvent.click(screen.getByRole('button', { name: /^Make pour/ }))
  expect(screen.getByRole('alert').textContent).toContain('needs its size east and its size north')
  expect(state.edit).not.toHaveBeenCalled()
})

test('who may not add pours is told who may', () => {
  state.canEdit = false
  render(<NewPourScreen jobId="job" />)
  expect(screen.getByRole('alert').textContent).toContain('A detailer or an engineer')
  expect(screen.queryByRole('button', { name: /^Make pour/ })).toBeNull()
})
