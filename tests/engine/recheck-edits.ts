import { toEngine } from '@wedgeline/contract'
import type { Anchor, Layout, Pan, Steel, SteelShape, Tendon } from '@wedgeline/engine'
import { demoLayout } from '../../db/seed/demo-layout'
import { anchor, B7, D4, EDGES, inPan, layout, pan, POUR, S4, twoPours } from './sample-layout'

/** One draw: what to do, to which row, by how much (each from 0 up to and without 1). */
export type Draw = readonly [number, number, number]

const pick = <T>(list: readonly T[], share: number): T | undefined => list[Math.floor(share * list.length)]
const between = (from: number, to: number, share: number): number => Math.round(from + share * (to - from))

/** One edit of a layout as somebody makes it at a desk; rows that it does not change stay the same objects. */
export function edited(of: Layout, [what, which, amount]: Draw): Layout {
  const edit = pick(EDITS, what)
  return edit ? edit(of, which, amount) : of
}

type Edit = (of: Layout, which: number, amount: number) => Layout

const EDITS: readonly Edit[] = [
  changedAnchor((one, by) => ({ ...one, chainage: one.chainage + between(-150, 150, by) })),
  changedAnchor((one, by) => ({ ...one, chainage: one.chainage + between(-1500, 1500, by) })),
  changedAnchor((one, by) => ({ ...one, height: between(60, 160, by) })),
  changedAnchor((one, by) => ({ ...one, setBack: between(90, 400, by) })),
  changedAnchor((one, by) => ({ ...one, skew: (by - 0.5) * 0.4 })),
  changedAnchor((one, by) => ({ ...one, straightBehind: by < 0.2 ? null : between(300, 1200, by) })),
  changedAnchor((one, by) => ({ ...one, number: between(1, 60, by) })),
  changedAnchor((one, by) => ({ ...one, hardwareId: by < 0.4 ? 'S4' : by < 0.6 ? 'B7' : 'D4' })),
  changedAnchor((one, by) => ({ ...one, end: by < 0.5 ? 'live' : 'dead' })),
  changedTendon((one, by) => ({ ...one, strands: between(1, 7, by) })),
  changedTendon((one, by) => ({ ...one, length: by < 0.2 ? null : between(5000, 40000, by) })),
  changedTendon((one, by) => ({ ...one, drape: by < 0.2 ? null : by })),
  changedTendon((one, by) => ({ ...one, mark: `${one.mark}x`, stressedFrom: by < 0.5 ? 'one-end' : 'both-ends' })),
  inserted,
  removed,
  steelAtAnchor,
  steelInGap,
  steelTakenOut,
  steelAlongEdge,
  movedPan,
]

function changedAnchor(change: (one: Anchor, by: number) => Anchor): Edit {
  return (of, which, amount) => {
    const one = pick(of.anchors, which)
    const after = one && change(one, amount)
    if (!one || !after || !of.hardware.some(({ id }) => id === after.hardwareId)) return of
    return { ...of, anchors: of.anchors.map((row) => (row === one ? after : row)) }
  }
}

function changedTendon(change: (one: Tendon, by: number) => Tendon): Edit {
  return (of, which, amount) => {
    const one = pick(of.tendons, which)
    return one ? { ...of, tendons: of.tendons.map((row) => (row === one ? change(row, amount) : row)) } : of
  }
}

/** A tendon with one end beside another anchor. */
function inserted(of: Layout, which: number, amount: number): Layout {
  const beside = pick(of.anchors, which)
  const like = of.tendons.find(({ id }) => id === beside?.tendonId)
  const id = `new-${of.anchors.length}-${Math.round(amount * 1e6)}`
  if (!beside || !like || beside.edgeId === null) return of
  return {
    ...of,
    tendons: [...of.tendons, { ...like, id: `T${id}`, mark: id }],
    anchors: [
      ...of.anchors,
      { ...beside, id, tendonId: `T${id}`, number: 50, chainage: beside.chainage + between(200, 1400, amount) },
    ],
  }
}

function removed(of: Layout, which: number): Layout {
  const one = pick(of.anchors, which)
  return {
    ...of,
    anchors: of.anchors.filter((row) => row !== one),
    steel: of.steel.filter(({ zone }) => {
      if (zone.kind === 'anchor') return zone.anchorId !== one?.id
      return zone.kind !== 'gap' || (zone.afterAnchorId !== one?.id && zone.beforeAnchorId !== one?.id)
    }),
  }
}

const AT_ANCHOR: readonly SteelShape[] = [
  { kind: 'links', diameter: 10, width: 300, height: 140, hook: 130, count: 5, first: 30, pitch: 60 },
  { kind: 'hairpins', diameter: 10, leg: 500, bend: 130, count: 4, lies: 'upright', first: 20, pitch: 110 },
  { kind: 'transverse-bars', diameter: 12, length: 1100, count: 3, layers: 'both', first: 60, pitch: 100 },
  { kind: 'spiral', diameter: 12, outside: 130, pitch: 50, turns: 5, flatTurns: 1, first: 0 },
]

const steelRow = (of: Layout, row: Pick<Steel, 'pourId' | 'zone' | 'shape'>): Layout => ({
  ...of,
  steel: [...of.steel, { id: `steel-${of.steel.length}-${row.zone.kind}`, source: 'by-hand', isLocked: false, ...row }],
})

function steelAtAnchor(of: Layout, which: number, amount: number): Layout {
  const [one, shape] = [pick(of.anchors, which), pick(AT_ANCHOR, amount)]
  if (!one || !shape) return of
  return steelRow(of, { pourId: one.castWithPourId, zone: { kind: 'anchor', anchorId: one.id }, shape })
}

function steelInGap(of: Layout, which: number, amount: number): Layout {
  const one = pick(of.anchors, which)
  if (!one || one.edgeId === null) return of
  const row = of.anchors.filter(({ edgeId }) => edgeId === one.edgeId).sort((a, b) => a.chainage - b.chainage)
  const next = row[row.indexOf(one) + 1]
  const zone = { kind: 'gap', edgeId: one.edgeId, afterAnchorId: one.id, beforeAnchorId: next?.id ?? null } as const
  const length = between(1000, 3500, amount)
  const shape = { kind: 'wedge-bars', diameter: 12, length, count: 3, layers: 'both' } as const
  return steelRow(of, { pourId: one.castWithPourId, zone, shape })
}

function steelTakenOut(of: Layout, which: number): Layout {
  const one = pick(of.steel, which)
  return { ...of, steel: of.steel.filter((row) => row !== one) }
}

function steelAlongEdge(of: Layout, which: number, amount: number): Layout {
  const one = pick(of.edges, which)
  const [from, to] = [one?.lengths[0]?.from ?? 0, one?.lengths.at(-1)?.to ?? 0]
  if (!one) return of
  const counts = { countTop: 1, countBottom: 2, first: between(100, 250, amount), pitch: 100 }
  const shape = { kind: 'edge-bars', diameter: 12, ...counts, from: from + 50, to: to - 50 } as const
  return steelRow(of, { pourId: one.pourId, zone: { kind: 'edge', edgeId: one.id }, shape })
}

function movedPan(of: Layout, which: number, amount: number): Layout {
  const one = pick(of.pans, which)
  const change = (row: Pan): Pan => ({ ...row, x: row.x + between(-400, 400, amount) })
  return { ...of, pans: of.pans.map((row) => (row === one ? change(row) : row)) }
}

/** The layouts that edits begin from. */
export const STARTS: readonly { readonly name: string; readonly of: () => Layout }[] = [
  { name: 'the demo', of: () => toEngine(demoLayout()) },
  { name: 'two pours in a row, live and dead ends in turn', of: () => rows({ spacing: 900 }) },
  { name: 'wide gaps with a pan', of: () => withPan(rows({ spacing: 2400 })) },
  { name: 'close anchors, forces after friction', of: () => afterFriction(rows({ spacing: 420 })) },
  { name: 'an equal row of live ends', of: () => layout({ anchors: equalRow(), steel: alongSouth() }) },
]

const equalRow = (): Anchor[] =>
  Array.from({ length: 18 }, (_, i) => anchor('E2', i + 1, { chainage: 1000 + 1000 * i, hardwareId: 'S4' }))

/** Tendons from the south to the north edge of the first pour, and some along the south of the second. */
function rows({ spacing }: { spacing: number }): Layout {
  const count = Math.floor(18_000 / spacing)
  const ends = Array.from({ length: count }, (_, i) => {
    const [live, dead] = i % 2 === 0 ? (['E2', 'E4'] as const) : (['E4', 'E2'] as const)
    const chainage = 600 + spacing * i
    const tendonId = `TE2-${i + 1}`
    const bonded = { end: 'dead', hardwareId: 'D4', setBack: 300 } as const
    return [anchor(live, i + 1, { chainage, tendonId }), anchor(dead, i + 1, { chainage, tendonId, ...bonded })]
  }).flat()
  const west = [1, 2, 3].map((i) => anchor('E1', i, { chainage: 2500 * i, hardwareId: 'B7', setBack: 120 }))
  const second = [1, 2, 3, 4, 5].map((i) => anchor('E2-P2', i, { chainage: 19200 + 1100 * i }))
  const anchors = [...ends, ...west, ...second]
  const one = layout({ ...twoPours(anchors), hardware: [S4, B7, D4], steel: alongSouth() })
  const tendons = [...new Map(one.tendons.map((row) => [row.id, { ...row, length: 17_000, drape: 0.2 }])).values()]
  return { ...one, tendons }
}

const alongSouth = (): Steel[] => [
  {
    id: 'along',
    pourId: POUR.id,
    zone: { kind: 'edge', edgeId: EDGES[0]?.id ?? '' },
    shape: { kind: 'edge-bars', diameter: 12, countTop: 2, countBottom: 2, first: 60, pitch: 150, from: 50, to: 19150 },
    source: 'by-hand',
    isLocked: false,
  },
]

function withPan(of: Layout): Layout {
  const own = pan('PN1', { x: 6000, y: 1500, azimuth: Math.PI })
  const end = { ...inPan('PN1'), tendonId: of.tendons[1]?.id ?? '' }
  const isSame = (one: Anchor) => one.tendonId === end.tendonId && one.edgeId === 'E2'
  return { ...of, pans: [own], anchors: [...of.anchors.filter((one) => !isSame(one)), end] }
}

const afterFriction = (of: Layout): Layout => ({
  ...of,
  job: { ...of.job, settings: { ...of.job.settings, deadEndForce: 'after-friction' } },
})
