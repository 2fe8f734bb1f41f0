import { toEngine } from '@wedgeline/contract'
import {
  BASIS_SOURCES,
  type JobSettings,
  type Layout,
  type Pour,
  type Reading,
  type Steel,
  type SteelShape,
  type SteelZone,
} from '@wedgeline/engine'
import { demoLayout } from '../../db/seed/demo-layout'
import { accepting, row } from './anchor-checks'
import { withPan } from './pan-layout'
import { anchor, edge, layout, length, WEST } from './sample-layout'
import { oneTendon } from './tendon-layout'

/**
 * Layouts that between them make the engine write every formula it has, in each basis: the demo with each answer to
 * each question, with bars of every kind in its zones, and small made-up ones for what it does not hold.
 */
export function sweepLayouts(): readonly Layout[] {
  const demo = toEngine(demoLayout())
  return BASIS_SOURCES.flatMap(({ id: basis, readings }) => {
    const inBasis = (of: Layout): Layout => ({ ...of, job: { ...of.job, basis, factors: [], readings: [] } })
    const answers = answerSets(readings)
    const proposed = answers[0] ?? []
    const others = answers.at(-1) ?? []
    return [
      accepting(inBasis(withBars(demo)), ...others),
      ...answers.map((ids) => accepting(inBasis(row('S4')), ...ids)),
      ...smallLayouts().map((of) => accepting(inBasis(of), ...proposed)),
    ]
  })
}

/** First the proposed readings, then the others, each time with another answer to the questions that have several. */
function answerSets(readings: readonly Reading[]): readonly (readonly string[])[] {
  const answers = readings.filter(({ choice }) => choice !== undefined)
  return answers.map((answer, at) => [
    answer.id,
    ...readings.filter(({ choice, proposed }) => choice === undefined && (at > 0 || proposed)).map(({ id }) => id),
  ])
}

/** The demo with bars of every kind in some of its zones and half of its mats spare. */
function withBars(of: Layout): Layout {
  const everyFifth = <T>(list: readonly T[]): readonly T[] => list.filter((_, at) => at % 5 === 0)
  const sets = [
    ...everyFifth(of.anchors).map(({ id, castWithPourId }) => ({
      pourId: castWithPourId,
      zone: { kind: 'anchor', anchorId: id } as const,
      shapes: AT_ANCHORS,
    })),
    ...everyFifth(of.anchors).flatMap(({ id, edgeId, castWithPourId }) =>
      edgeId === null
        ? []
        : [
            {
              pourId: castWithPourId,
              zone: { kind: 'gap', edgeId, afterAnchorId: id, beforeAnchorId: null } as const,
              shapes: IN_GAPS,
            },
          ],
    ),
    ...of.pans.map(({ id, pourId }) => ({ pourId, zone: { kind: 'pan', panId: id } as const, shapes: AT_PANS })),
    ...of.joints.map(({ id, firstPourId }) => ({
      pourId: firstPourId,
      zone: { kind: 'joint', jointId: id } as const,
      shapes: AT_JOINTS,
    })),
  ]
  const steel = sets.flatMap(({ shapes, ...place }, set) =>
    shapes.map((shape, at) => bars(`sweep-${set}-${at}`, place, shape)),
  )
  return { ...of, steel: [...of.steel, ...steel], pours: of.pours.map(withSpareMats) }
}

const bars = (id: string, place: { pourId: string; zone: SteelZone }, shape: SteelShape): Steel => ({
  ...place,
  id,
  shape,
  source: 'by-hand',
  isLocked: true,
})

const withSpareMats = (pour: Pour): Pour => ({ ...pour, mats: pour.mats.map((mat) => ({ ...mat, spareShare: 0.5 })) })

const AT_ANCHORS: readonly SteelShape[] = [
  { kind: 'spiral', diameter: 12, outside: 150, pitch: 50, turns: 6, flatTurns: 2, first: 20 },
  { kind: 'links', diameter: 8, width: 300, height: 140, hook: 115, count: 4, first: 60, pitch: 60 },
  { kind: 'hairpins', diameter: 10, leg: 600, bend: 140, count: 2, lies: 'upright', first: 40, pitch: 120 },
  { kind: 'hairpins', diameter: 10, leg: 600, bend: 300, count: 2, lies: 'flat', first: 40, pitch: 60 },
  { kind: 'transverse-bars', diameter: 12, length: 1600, count: 6, layers: 'both', first: 200, pitch: 150 },
]
const IN_GAPS: readonly SteelShape[] = [{ kind: 'wedge-bars', diameter: 12, length: 2600, count: 8, layers: 'both' }]
const placed = { diameter: 12, length: 2000, count: 4, layers: 'both', pitch: 100 } as const
const AT_PANS: readonly SteelShape[] = [
  { ...placed, kind: 'tie-back-bars', runs: 'along' },
  { ...placed, kind: 'lap-bars', runs: 'along' },
  { ...placed, kind: 'trimmers', runs: 'along' },
  { ...placed, kind: 'trimmers', runs: 'across' },
  { ...placed, kind: 'diagonals', runs: 'along', count: 1 },
]
const AT_JOINTS: readonly SteelShape[] = [
  { ...placed, kind: 'lap-bars', runs: 'across', length: 4000, count: 40 },
  { ...placed, kind: 'tie-back-bars', runs: 'across', length: 4000, count: 40 },
]

/** What the demo does not hold. */
function smallLayouts(): readonly Layout[] {
  const settings = (of: Layout, change: Partial<JobSettings>): Layout => ({
    ...of,
    job: { ...of.job, settings: { ...of.job.settings, ...change } },
  })
  return [
    // One bend in plan; no friction at all; wobble beside mu; draw-in as far as the other end, also without friction.
    oneTendon({ tendon: { path: [{ x: 10_600, y: 8700 }] } }),
    oneTendon({ settings: { deadEndForce: 'after-friction' } }),
    oneTendon({ settings: { frictionFamily: 'outside', deadEndForce: 'after-friction' } }),
    oneTendon({ drawIn: 40 }),
    oneTendon({ drawIn: 10, tendon: { drape: 0 }, settings: { frictionMu: 0, frictionMuLow: 0, frictionMuHigh: 0 } }),
    oneTendon({ tendon: { stressedFrom: 'both-ends' }, far: { end: 'live' } }),
    settings(row('S4A'), { crackWidth: 0.2, crackTensile: 2.2, crackCompression: 0.5 }),
    settings(row('K4', { middle: { elevation: 0.1, skew: 0.2 } }), { crackWidth: 0.25, wedgeSpread: 0.6 }),
    settings(row('D4', { middle: { height: 130 } }), { spreadStart: 'device-end', crackWidth: 0.1 }),
    // Two that act as one, side by side.
    layout({ anchors: [1, 2].map((n) => anchor('E4', n, { chainage: 8600 + 400 * n })) }),
    // Two in one section 700 deep, one above the other.
    layout({
      anchors: [-100, 50].map((height, at) => anchor('E1', at + 1, { chainage: 300, height })),
      edges: [edge(WEST, 'd', [length(0, 17_400, { soffit: -480 })])],
    }),
    withPan({ pan: { tieBackForce: 200_000, tieBackReason: 'strut and tie' } }),
  ]
}
