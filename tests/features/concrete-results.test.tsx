import { applyCommands, layoutSchema, toEngine, type Command, type LayoutFile } from '@wedgeline/contract'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, test, vi, type Mock } from 'vitest'
import { setRows, stageWords, typedStrengths } from '@/features/pour/concrete-results'
import { ConcreteResultsSection } from '@/features/pour/concrete-results-section'
import { strengthAtStages } from '@wedgeline/engine'
import { expectAccessible } from '../components/axe'
import example from '../../docs/example-layout.json'

const state = vi.hoisted((): { edit: Mock; canEdit: boolean; layout: unknown } => ({
  edit: vi.fn(),
  canEdit: true,
  layout: null,
}))
vi.mock('expo-router', () => ({ router: { push: () => {} } }))
vi.mock('@/features/editing/job-draft', () => ({
  useJobDraft: () => ({ layout: state.layout, canEdit: state.canEdit, edit: state.edit }),
}))

const file: LayoutFile = layoutSchema.parse(example)
const [pour] = file.pours
if (!pour) throw new Error('The example has no pour.')
const stages = [
  { id: 's1', name: '25 %', share: 0.25, strengthMPa: 9 },
  { id: 's2', name: 'full', share: 1, strengthMPa: 22 },
]
const tested = { ...pour, stages }
const cured = 'on site beside the pour'
const set = (id: string, ageHours: number, specimensMPa: number[]) => ({
  id,
  pourId: pour.id,
  ageHours,
  cured,
  certificate: 'CYL (invented)',
  specimensMPa,
})
const withSets = (...concreteResults: LayoutFile['concreteResults']): LayoutFile => ({
  ...file,
  pours: [tested, ...file.pours.slice(1)],
  concreteResults,
})

beforeEach(() => {
  state.edit.mockClear()
  state.canEdit = true
})

describe('strengths as they are typed', () => {
  test.each([
    ['21.4 22.4 23.1', [21.4, 22.4, 23.1]],
    ['21.4; 22.4, 23.1', [21.4, 22.4, 23.1]],
    [' 22 MPa ', [22]],
  ])('%s', (text, strengths) => {
    expect(typedStrengths(text)).toEqual({ strengths })
  })

  test.each(['', '  ', '0', '-3', '201', 'twenty', '21.4 x'])('%j is not taken, with what would be right', (text) => {
    expect(typedStrengths(text)).toMatchObject({ problem: expect.stringContaining('21.4') as string })
  })
})

describe('what is recorded', () => {
  const shown = (layout: LayoutFile) => {
    const { pours, concreteResults } = toEngine(layout)
    const [first] = pours
    if (!first) throw new Error('No pour.')
    return {
      stages: strengthAtStages(first, concreteResults).map(stageWords),
      rows: setRows(first, concreteResults).map(({ against }) => against.map(({ words }) => words)),
    }
  }

  test('nothing: said for each stage, and who decides', () => {
    expect(shown(withSets()).stages).toEqual([
      '25 %, 9 MPa: nothing recorded against 25 %. A named engineer decides.',
      'full, 22 MPa: nothing recorded against full. A named engineer decides.',
    ])
  })

  test('short sets stand, youngest first', () => {
    // 22 - 17.2 = 4.8 and 22 - 21.4 = 0.6.
    const { stages, rows } = shown(
      withSets(set('c', 144, [23.1, 21.4, 22.4]), set('a', 24, [9.3]), set('b', 96, [17.2])),
    )
    expect(stages[1]).toBe('full, 22 MPa: no set cured on site reaches it. A named engineer decides.')
    expect(rows).toEqual([
      ['25 %: 9.3 of 9, spare 0.3'],
      ['full: 17.2 of 22, short by 4.8'],
      ['full: 21.4 of 22, short by 0.6'],
    ])
  })

  test('no words that release anything', () => {
    const { stages } = shown(withSets(set('a', 24, [9.3]), set('b', 96, [25])))
    expect(stages).toEqual(['25 %, 9 MPa: reached at 24 h, lowest 9.3.', 'full, 22 MPa: reached at 96 h, lowest 25.'])
    expect(stages.join(' ')).not.toMatch(/\b(ready|clear|OK|safe|pass)/i)
  })
})

describe('the section of a pour', () => {
  test('a set is added with its age, strengths and certificate', async () => {
    state.layout = withSets()
    render(<ConcreteResultsSection pour={tested} />)
    await userEvent.click(screen.getByRole('button', { name: 'Add a set' }))
    await userEvent.click(screen.getByRole('button', { name: 'Store' }))
    expect(state.edit).not.toHaveBeenCalled()
    await userEvent.type(screen.getByRole('textbox', { name: /^Age when tested/ }), '96{Tab}')
    await userEvent.type(screen.getByRole('textbox', { name: /^Strength of each/ }), '17.2 17.8')
    await userEvent.type(screen.getByRole('textbox', { name: 'Certificate' }), 'C-96')
    await userEvent.click(screen.getByRole('button', { name: 'Store' }))
    const change = state.edit.mock.calls[0]?.[0] as { commands: Command[] }
    const { layout } = applyCommands(withSets(), change.commands)
    expect(layout.concreteResults).toMatchObject([
      { pourId: pour.id, ageHours: 96, cured, certificate: 'C-96', specimensMPa: [17.2, 17.8] },
    ])
  })

  test('a set is shown with its mean, changed and removed', async () => {
    state.layout = withSets(set('c', 144, [21.4, 22.4, 23.1]))
    render(<ConcreteResultsSection pour={tested} />)
    // (21.4 + 22.4 + 23.1) / 3 = 22.3
    expect(screen.getByText('lowest 21.4, mean 22.3 MPa')).toBeTruthy()
    await expectAccessible()
    await userEvent.click(screen.getByRole('button', { name: 'Change the set at 144 h' }))
    await userEvent.click(within(screen.getByRole('dialog')).getByRole('button', { name: 'Remove this set' }))
    expect(state.edit.mock.calls[0]?.[0]).toMatchObject({
      commands: [{ type: 'remove', table: 'concreteResults', id: 'c' }],
    })
  })

  test('who may only read sees the sets and no buttons', () => {
    state.canEdit = false
    state.layout = withSets(set('c', 144, [21.4]))
    render(<ConcreteResultsSection pour={tested} />)
    expect(screen.queryAllByRole('button')).toEqual([])
  })
})
