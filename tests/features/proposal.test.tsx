import { applyCommands, layoutSchema, toEngine, type Command, type LayoutFile } from '@wedgeline/contract'
import { checkPour, proposeSteel, type ProposeAsk } from '@wedgeline/engine'
import { render, screen, within } from '@testing-library/react'
import userEvent from '@testing-library/user-event'
import { beforeEach, describe, expect, test, vi } from 'vitest'
import { ProposalDialog } from '@/features/proposal/proposal-dialog'
import { proposalCommands } from '@/features/proposal/proposal-commands'
import { expectAccessible } from '../components/axe'
import example from '../../docs/example-layout.json'

interface Edit {
  readonly label: string
  readonly commands: readonly Command[]
}

interface State {
  readonly edits: Edit[]
  layout: unknown
  propose: (layout: never, ask: ProposeAsk) => Promise<unknown>
}

const state = vi.hoisted((): State => ({ edits: [], layout: null, propose: () => Promise.resolve(null) }))

vi.mock('expo-router', () => ({ router: {} }))
vi.mock('@/features/editing/job-draft', () => ({
  useJobDraft: () => ({ layout: state.layout, canEdit: true, edit: (change: Edit) => state.edits.push(change) }),
}))
vi.mock('@/features/editing/pour-checks', () => ({
  pageEngine: () => ({ propose: (layout: never, ask: ProposeAsk) => state.propose(layout, ask) }),
}))

/** The example with its steel taken away, and nothing asked for against cracks in its wedges. */
function bareExample(): LayoutFile {
  const layout = layoutSchema.parse(example)
  const readings = ['en-window', 'en-steel-300', 'en-crack-edge-bars'].map((readingId) => ({
    readingId,
    acceptedBy: 'A. Engineer',
    acceptedAtMs: 1,
    reason: 'usual slab',
  }))
  return layoutSchema.parse({ ...layout, steel: [], job: { ...layout.job, readings } })
}

const layout = bareExample()
const pourId = layout.pours[0]?.id ?? ''
const proposal = proposeSteel(toEngine(layout), { pourId })
const offered = proposal.zones.filter(({ blocked }) => blocked.length === 0)
const counted = () => {
  let next = 0
  return () => `new-${++next}`
}

beforeEach(() => {
  state.layout = layout
  state.edits.length = 0
  state.propose = (of: never, ask) => Promise.resolve(proposeSteel(of, ask))
})

const show = () => render(<ProposalDialog pourId={pourId} what="pour P1" onClose={() => undefined} />)

describe('Proposed bars', () => {
  test('stand in the layout as one edit, and the checks of their places then pass', () => {
    expect(offered.length).toBeGreaterThan(0)
    const applied = applyCommands(layout, proposalCommands(offered, counted()))
    const after = checkPour(toEngine(applied.layout), { pourId })
    for (const { zone } of offered) {
      const checks = after.zones.find((one) => one.zone.id === zone.id)?.checks ?? []
      const over = checks.filter(
        (check) => check.kind === 'compared' && check.unit === 'mm2' && check.statusOnceAccepted === 'over',
      )
      expect(over).toEqual([])
    }
    expect(applyCommands(applied.layout, applied.inverse).layout.steel).toEqual(layout.steel)
  })

  test('every place is listed with old and new, and what is left out is not put in', async () => {
    show()
    const [first, ...rest] = offered
    const box = await screen.findByRole('checkbox', { name: first?.zone.name ?? '' })
    expect(screen.getAllByRole('checkbox')).toHaveLength(offered.length)
    expect(screen.getAllByText('no bars').length).toBeGreaterThan(0)
    await userEvent.click(box)
    await userEvent.click(screen.getByRole('button', { name: `Put in at ${rest.length} of ${offered.length}` }))
    expect(state.edits).toHaveLength(1)
    const zones = state.edits[0]?.commands.flatMap((command) => (command.type === 'insert' ? [command.row.zone] : []))
    expect(zones).toHaveLength(rest.flatMap(({ adds }) => adds).length)
    expect(zones).not.toContainEqual(first?.place)
  })

  test('where nothing passes each candidate stands with the check that stops it', async () => {
    const [zone] = offered
    if (!zone) throw new Error('the example asks for bars')
    const stopped = {
      ...zone,
      adds: [],
      blocked: [{ candidate: '8 links B8', check: 'Clear gap', by: 'short by 4 mm' }],
    }
    state.propose = () => Promise.resolve({ ...proposal, zones: [stopped] })
    show()
    expect(await screen.findByRole('heading', { name: 'Nothing passes at 1 place' })).toBeTruthy()
    expect(screen.getByText('8 links B8')).toBeTruthy()
    expect(screen.getByText('Clear gap, short by 4 mm')).toBeTruthy()
    expect(screen.getByRole('button', { name: 'Put in' }).getAttribute('aria-disabled')).toBe('true')
  })

  test('a number of marks is picked from the curve, and asked of the engine', async () => {
    const asked: (number | undefined)[] = []
    const curve = [
      { marks: 2, mass: 120 },
      { marks: 5, mass: 90 },
    ]
    state.propose = (_, ask) => {
      asked.push(ask.marksAtMost)
      return Promise.resolve({ ...proposal, curve, point: ask.marksAtMost ?? 5 })
    }
    show()
    await userEvent.selectOptions(await screen.findByLabelText(/Different new marks/), '2')
    expect(asked).toEqual([undefined, 2])
    expect(screen.getByRole('img', { name: /from 120.0 kg with 2 to 90.0 kg with 5/ })).toBeTruthy()
  })

  test('waits, fails and has nothing to change, each in words', async () => {
    state.propose = () => new Promise(() => undefined)
    const waiting = show()
    expect(within(screen.getByRole('status')).getByText(/Trying bars/)).toBeTruthy()
    waiting.unmount()
    state.propose = () => Promise.reject(new Error('No anchor has the id.'))
    const failing = show()
    expect((await screen.findByRole('alert')).textContent).toContain('No anchor has the id.')
    failing.unmount()
    state.propose = () => Promise.resolve({ ...proposal, zones: [], curve: [] })
    show()
    expect(await screen.findByText(/Nothing to put in: no check here that bars answer is over its limit/)).toBeTruthy()
  })

  test('can be used without sight and without a mouse', async () => {
    const { container } = show()
    await screen.findAllByRole('checkbox')
    await expectAccessible(container.ownerDocument.body)
  })
})
