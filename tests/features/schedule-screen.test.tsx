import { layoutSchema, toEngine, type Command, type LayoutFile } from '@wedgeline/contract'
import { scheduleOf } from '@wedgeline/engine'
import { screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, test, vi } from 'vitest'
import { ScheduleScreen } from '@/features/schedule/schedule-screen'
import { expectAccessible } from '../components/axe'
import { renderOver } from './fake-server'
import example from '../../docs/example-layout.json'

interface Edit {
  readonly label: string
  readonly commands: readonly Command[]
}

interface State {
  readonly edits: Edit[]
  layout: LayoutFile | null
  roles: readonly string[]
}

const state = vi.hoisted((): State => ({ edits: [], layout: null, roles: [] }))

vi.mock('expo-router', () => ({ router: {} }))
vi.mock('@/features/editing/job-draft', () => ({
  useJobDraft: () => ({
    jobId: 'job',
    layout: state.layout,
    roles: state.roles,
    canEdit: state.roles.includes('detailer'),
    canSetDeliveries: state.roles.includes('detailer') || state.roles.includes('drafter'),
    save: 'saved',
    edit: (change: Edit) => state.edits.push(change),
  }),
}))
vi.mock('@/features/editing/save-state', () => ({ SaveState: () => null }))

const plain = layoutSchema.parse(example)
const pourId = plain.pours[0]?.id ?? ''
const loads = [
  { id: 'd1', name: 'First load', neededOn: '2026-03-09', edgeIds: ['E7-E'], panIds: ['PN06'] },
  { id: 'd2', name: 'Second load', neededOn: null, edgeIds: ['E5'], panIds: [] },
]
const withLoads = layoutSchema.parse({ ...plain, pours: plain.pours.map((pour) => ({ ...pour, deliveries: loads })) })

function show(layout: LayoutFile) {
  state.layout = layout
  const schedule = scheduleOf(toEngine(layout), pourId, [])
  renderOver({ 'schedule.byPour': () => schedule }, <ScheduleScreen jobId="job" pourId={pourId} />)
}

const cellsOf = (table: HTMLElement, rowName: string) =>
  within(within(table).getByRole('rowheader', { name: rowName }).closest('tr') as HTMLElement)
    .getAllByRole('cell')
    .map(({ textContent }) => textContent)

const changesOf = ({ commands }: Edit) =>
  commands.map((command) => (command.type === 'set' && command.table === 'pours' ? command.changes : command))

beforeEach(() => {
  state.edits.length = 0
  state.roles = ['detailer']
})

describe('The schedule screen', () => {
  test('adds up bars, metres and mass by size, and names the longest bar', async () => {
    show(plain)
    const totals = await screen.findByRole('table', { name: 'Totals by type and size' })
    // Edge bars as they stand in the example, top and bottom, ends at 50 mm: E5 and E6 four of 8,975 each, E7-E two of
    // 10,700, E7-ER two of 6,500, E7-N four of 6,575, E7-NR two of 4,700: 71.8 + 21.4 + 13.0 + 26.3 + 9.4 = 141.9 m.
    // At 0.888 kg/m (BS 4449): 126.0 kg.
    expect(cellsOf(totals, 'B12')).toEqual(['18', '141.9', '0.888', '126.0'])
    expect(screen.getByText(/^Longest bar: 10700 mm, mark \d+\.$/)).toBeTruthy()
    const kinds = screen.getByRole('table', { name: 'Totals by kind of bar' })
    expect(cellsOf(kinds, 'edge bars')).toEqual(['18', '141.9', '126.0'])
  })

  test('without deliveries says that all comes together and shows no table of them', async () => {
    show(plain)
    expect(await screen.findByText('No deliveries yet: all bars of the pour come together.')).toBeTruthy()
    expect(screen.queryByRole('table', { name: 'Totals by delivery' })).toBeNull()
  })

  test('tells each delivery with its day and members, and last what none names', async () => {
    show(withLoads)
    const table = await screen.findByRole('table', { name: 'Totals by delivery' })
    const heads = within(table).getAllByRole('rowheader')
    expect(heads.slice(0, 2).map(({ textContent }) => textContent)).toEqual(['First load', 'Second load'])
    expect(cellsOf(table, 'First load').slice(0, 2)).toEqual(['2026-03-09', 'E7-E, PN06'])
    expect(cellsOf(table, 'Second load').slice(0, 2)).toEqual(['no day agreed', 'E5'])
    const last = heads[2]?.textContent ?? ''
    expect(cellsOf(table, last)[1]).toContain('E6')
  })

  test('a member put into a delivery is one edit of that delivery alone', async () => {
    show(withLoads)
    const group = await screen.findByRole('group', { name: 'Second load' })
    await userEvent.click(within(group).getByRole('checkbox', { name: 'PN07' }))
    expect(state.edits).toHaveLength(1)
    expect(state.edits.flatMap(changesOf)).toEqual([{ deliveries: [loads[0], { ...loads[1], panIds: ['PN07'] }] }])
  })

  test('a day that is none is refused in words and nothing is sent', async () => {
    show(withLoads)
    const group = await screen.findByRole('group', { name: 'First load' })
    const day = within(group).getByLabelText(/Needed on/)
    await userEvent.clear(day)
    await userEvent.type(day, '2026-02-30{Enter}')
    expect(screen.getByRole('alert').textContent).toContain('Not taken')
    expect(state.edits).toEqual([])
  })

  test('a drafter sets marks and deliveries', async () => {
    state.roles = ['drafter']
    show(withLoads)
    await userEvent.type(await screen.findByLabelText(/Prefix of marks/), 'N')
    const first = screen.getByLabelText(/First mark/)
    await userEvent.clear(first)
    await userEvent.type(first, '20')
    await userEvent.click(screen.getByRole('button', { name: 'Remove First load' }))
    expect(state.edits.flatMap(changesOf)).toEqual([{ markPrefix: 'N' }, { firstMark: 20 }, { deliveries: [loads[1]] }])
    await userEvent.click(screen.getByRole('button', { name: 'Add a delivery' }))
    expect(state.edits.at(-1)?.label).toBe('Add a delivery')
  })

  test('an inspector reads them and changes nothing', async () => {
    state.roles = ['inspector']
    show(withLoads)
    const prefix = await screen.findByLabelText(/Prefix of marks/)
    expect((prefix as HTMLInputElement).disabled || (prefix as HTMLInputElement).readOnly).toBe(true)
    expect(screen.queryByRole('button', { name: 'Add a delivery' })).toBeNull()
    expect(screen.queryByRole('button', { name: 'Remove First load' })).toBeNull()
    expect(screen.queryByRole('button', { name: 'Export workbook' })).toBeNull()
  })

  test('can be used without sight and without a mouse', async () => {
    show(withLoads)
    await screen.findByRole('table', { name: 'Totals by delivery' })
    await expectAccessible(document.body)
  })
})
