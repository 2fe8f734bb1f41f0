import { layoutSchema, toEngine, type LayoutFile } from '@wedgeline/contract'
import { checkPour } from '@wedgeline/engine'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, expect, test, vi, type Mock } from 'vitest'
import { PanScreen } from '@/features/pan/pan-screen'
import { demoLayout } from '../../db/seed/demo-layout'
import { expectAccessible } from '../components/axe'

interface Shown {
  edit: Mock
  canEdit: boolean
  layout: LayoutFile | null
  checks: unknown
}

const state = vi.hoisted((): Shown => ({ edit: vi.fn(), canEdit: true, layout: null, checks: null }))

vi.mock('expo-router', () => ({ router: { push: () => {} }, useLocalSearchParams: () => ({}) }))
vi.mock('@/features/editing/job-draft', () => ({
  useJobDraft: () => ({
    jobId: 'job',
    layout: state.layout,
    canEdit: state.canEdit,
    canUndo: false,
    undoLabel: null,
    undo: () => {},
    edit: state.edit,
  }),
}))
vi.mock('@/features/editing/pour-checks', () => ({ usePourChecks: () => state.checks }))
vi.mock('@/features/editing/save-state', () => ({ SaveState: () => null }))

const layout = layoutSchema.parse(demoLayout())
const result = checkPour(toEngine(layout), { pourId: 'P1' })

beforeEach(() => {
  state.layout = layout
  state.checks = { result, failure: null, isStale: false }
  state.canEdit = true
  state.edit.mockClear()
})

test('a pan whose jack does not fit says by how much, and nothing about it is out of reach', async () => {
  const { container } = render(<PanScreen jobId="job" panId="PN03" />)
  expect(screen.getByRole('heading', { level: 1 }).textContent).toBe('Pan PN03')
  const room = screen.getByRole('button', { name: /Room along the jack/ })
  // 700 in plan under 12 degrees against 620 + 200 + 150 + 230.
  expect(room.textContent).toContain('716 mm, needs 1200 mm')
  expect(room.textContent).toContain('short by 484 mm')
  expect(screen.getByText(/620 closed \+ 200 stroke \+ 150 tail \+ 230 hand = 1200/)).toBeDefined()
  await expectAccessible(container)
})

test('a pan that is gone is said so', () => {
  render(<PanScreen jobId="job" panId="gone" />)
  expect(screen.getByRole('alert').textContent).toContain('not in the job')
})

test('checks that are being worked out and checks that failed each have words', () => {
  state.checks = { result: null, failure: null, isStale: true }
  const { rerender } = render(<PanScreen jobId="job" panId="PN01" />)
  expect(screen.getByRole('status').textContent).toContain('the checks of this pan')
  state.checks = { result: null, failure: 'No pan has the id.', isStale: false }
  rerender(<PanScreen jobId="job" panId="PN01" />)
  expect(screen.getByRole('alert').textContent).toContain('No pan has the id.')
})

test('the depth of the recess is one edit of the pan', async () => {
  const person = userEvent.setup()
  render(<PanScreen jobId="job" panId="PN01" />)
  const field = within(screen.getByRole('group', { name: 'Recess' })).getByLabelText(/^Depth at the bearing face/)
  await person.clear(field)
  await person.type(field, '140{Enter}')
  expect(state.edit).toHaveBeenCalledWith(
    expect.objectContaining({ commands: [{ type: 'set', table: 'pans', id: 'PN01', changes: { depthMm: 140 } }] }),
  )
})

test('bars are added for the pan; a reader adds none', async () => {
  const person = userEvent.setup()
  const { rerender } = render(<PanScreen jobId="job" panId="PN01" />)
  await person.click(screen.getByRole('button', { name: 'Add tie-back bars' }))
  // Beside the recess: 350 / 2 + 30 + 8 = 213, in steps of 5 on each side: 430 apart.
  expect(state.edit).toHaveBeenCalledWith(
    expect.objectContaining({
      commands: [
        expect.objectContaining({
          type: 'insert',
          table: 'steel',
          row: expect.objectContaining({
            zone: { kind: 'pan', panId: 'PN01' },
            shape: expect.objectContaining({ kind: 'tie-back-bars', layers: 'both', count: 2, pitchMm: 430 }),
          }),
        }),
      ],
    }),
  )
  state.canEdit = false
  rerender(<PanScreen jobId="job" panId="PN01" />)
  expect(screen.queryByRole('button', { name: /^Add/ })).toBeNull()
})
