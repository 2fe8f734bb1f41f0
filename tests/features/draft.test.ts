import type { Batch, Command, LayoutFile } from '@wedgeline/contract'
import { layoutSchema } from '@wedgeline/contract'
import { describe, expect, test } from 'vitest'
import {
  acknowledged,
  edit,
  openDraft,
  redo,
  refusedAsStale,
  restore,
  settle,
  takeBatch,
  undo,
} from '@/features/editing/draft'
import { DraftStore, type DraftPorts, type Sent } from '@/features/editing/draft-store'

const layout: LayoutFile = layoutSchema.parse({
  format: 'wedgeline.layout',
  version: 1,
  job: { id: 'job', number: 'J1', title: 'Test' },
  levels: [{ id: 'L1', mark: 'L1' }],
  gridLines: [{ id: 'A', name: 'A', xMm: 0, yMm: 0, azimuthDeg: 0 }],
  pours: [],
})

const move = (xMm: number): Command => ({ type: 'set', table: 'gridLines', id: 'A', changes: { xMm } })
const open = (versions: Record<string, number> = { job: 3 }) => openDraft({ jobId: 'job', layout, versions })
const gridX = (of: LayoutFile) => of.gridLines[0]?.xMm

describe('draft', () => {
  test('an edit shows at once, undo brings the exact layout back, redo does it again', () => {
    const edited = edit(open(), { label: 'Move A', commands: [move(300)] })
    expect(gridX(edited.layout)).toBe(300)
    const back = undo(edited)
    expect(back.layout).toEqual(layout)
    expect(gridX(redo(back).layout)).toBe(300)
  })

  test('keys typed into one field are one step of undo and one unsent command', () => {
    let draft = open()
    for (const x of [3, 30, 300]) draft = edit(draft, { label: 'Move A', key: 'A.xMm', commands: [move(x)] })
    expect(draft.unsent).toEqual([move(300)])
    expect(undo(draft).layout).toEqual(layout)
  })

  test('a batch carries the version last seen of each unit that it touches, and only one is on its way', () => {
    const sending = takeBatch(edit(open(), { label: 'Move A', commands: [move(300)] }), 'b1')
    expect(sending.sending).toMatchObject({ id: 'b1', bases: { job: 3 }, commands: [move(300)] })
    const more = takeBatch(edit(sending, { label: 'Move A', commands: [move(400)] }), 'b2')
    expect(more.sending?.id).toBe('b1')
    expect(more.unsent).toEqual([move(400)])
  })

  test('an acknowledged batch becomes the base and its new version is used next', () => {
    const stored = acknowledged(takeBatch(edit(open(), { label: 'x', commands: [move(300)] }), 'b1'), { job: 4 })
    expect(gridX(stored.base)).toBe(300)
    expect(stored.versions).toEqual({ job: 4 })
  })

  test('a stale batch goes back to the unsent ones and nothing more is sent until it is settled', () => {
    const sending = takeBatch(edit(open(), { label: 'x', commands: [move(300)] }), 'b1')
    const conflict = { table: 'gridLines', id: 'A', field: 'xMm', mine: 300, theirs: 200 } as const
    const stale = refusedAsStale(sending, [conflict])
    expect(takeBatch(stale, 'b2').sending).toBeNull()
    const newer = {
      layout: { ...layout, gridLines: [{ id: 'A', name: 'A', xMm: 200, yMm: 0, azimuthDeg: 0 }] },
      versions: { job: 4 },
    }
    expect(gridX(settle(stale, newer, 'mine').draft.layout)).toBe(300)
    expect(gridX(settle(stale, newer, 'theirs').draft.layout)).toBe(200)
  })

  test('kept commands whose row is gone are returned, the others stay', () => {
    const gone: Command = { type: 'set', table: 'gridLines', id: 'B', changes: { xMm: 1 } }
    const restored = restore(open(), [gone, move(300)])
    expect(restored.dropped).toEqual([gone])
    expect(gridX(restored.draft.layout)).toBe(300)
  })
})

/** A page's outside: timers run by hand, the wire answers what the test says. */
function outside(answers: (batch: Batch) => Promise<Sent>) {
  const timers: (() => void)[] = []
  const state = { kept: null as Awaited<ReturnType<DraftPorts['kept']>>, sent: [] as Batch[], ids: 0 }
  const ports: DraftPorts = {
    load: () => Promise.resolve({ layout, versions: { job: 3 } }),
    send: (batch) => {
      state.sent.push(batch)
      return answers(batch)
    },
    keep: (unsaved) => {
      state.kept = unsaved
      return Promise.resolve()
    },
    kept: () => Promise.resolve(state.kept),
    newId: () => `b${++state.ids}`,
    later: (run) => {
      timers.push(run)
      return () => timers.splice(timers.indexOf(run), 1)
    },
  }
  const tick = async () => {
    timers.shift()?.()
    for (let i = 0; i < 10; i++) await Promise.resolve()
  }
  return { ports, state, tick }
}

describe('draft store', () => {
  test('an edit is kept before it is sent, and saved by itself', async () => {
    const { ports, state, tick } = outside(() => Promise.resolve({ kind: 'stored', versions: { job: 4 } }))
    const store = new DraftStore(ports)
    await store.open()
    store.edit({ label: 'Move A', commands: [move(300)] })
    expect(state.kept?.unsent).toEqual([move(300)])
    expect(store.current().save).toBe('unsaved')
    await tick()
    expect(state.sent).toHaveLength(1)
    expect(store.current().save).toBe('saved')
    expect(state.kept).toEqual({ sending: null, unsent: [] })
  })

  test('a failing wire sends the same batch again under the same id', async () => {
    let isDown = true
    const { ports, state, tick } = outside(() =>
      isDown ? Promise.reject(new Error('down')) : Promise.resolve({ kind: 'stored', versions: { job: 4 } }),
    )
    const store = new DraftStore(ports)
    await store.open()
    store.edit({ label: 'Move A', commands: [move(300)] })
    await tick()
    expect(store.current().save).toBe('not-sent')
    isDown = false
    await tick()
    expect(state.sent.map(({ id }) => id)).toEqual(['b1', 'b1'])
    expect(store.current().save).toBe('saved')
  })

  test('a reload in the middle of sending sends the kept batch first, then puts the rest back', async () => {
    const { ports, state } = outside(() => Promise.resolve({ kind: 'stored', versions: { job: 4 } }))
    state.kept = {
      sending: { id: 'b0', jobId: 'job', bases: { job: 3 }, commands: [move(300)] },
      unsent: [{ type: 'set', table: 'levels', id: 'L1', changes: { title: 'Podium' } }],
    }
    const store = new DraftStore(ports)
    await store.open()
    expect(state.sent.map(({ id }) => id)).toEqual(['b0'])
    expect(store.current().draft?.layout.levels[0]?.title).toBe('Podium')
    expect(store.current().draft?.unsent).toHaveLength(1)
  })

  test('a stale batch shows both values and keeps what was typed', async () => {
    const conflicts = [{ table: 'gridLines', id: 'A', field: 'xMm', mine: 300, theirs: 200 } as const]
    const { ports, tick } = outside(() => Promise.resolve({ kind: 'stale', conflicts }))
    const store = new DraftStore(ports)
    await store.open()
    store.edit({ label: 'Move A', commands: [move(300)] })
    await tick()
    expect(store.current().save).toBe('conflict')
    expect(store.current().draft?.conflicts).toEqual(conflicts)
    expect(store.current().draft?.layout.gridLines[0]?.xMm).toBe(300)
  })
})
